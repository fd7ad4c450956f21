import { StyleSheet, View } from 'react-native';
import { Field } from '@/components/ui/field';
import { Menu } from '@/components/ui/menu';
import { Segments } from '@/components/ui/segments';
import { Text } from '@/components/ui/text';
import type { PlantRevision } from '@/contract';

interface PlantChoiceProps {
  plants: readonly PlantRevision[];
  plantId: string;
  /** "" is the latest. */
  revision: string;
  error?: string;
  onChange: (choice: { plantId?: string; plantRevision?: string }) => void;
}

const ways = [
  { value: 'latest', label: 'always the latest' },
  { value: 'fixed', label: 'one revision' },
] as const;

/** Which plant a case stands on, and whether it follows that plant's revisions. */
export function PlantChoice({ plants, plantId, revision, error, onChange }: PlantChoiceProps) {
  const plant = plants.find(({ id }) => id === plantId);
  const way = revision === '' ? 'latest' : 'fixed';
  const choose = (next: 'latest' | 'fixed') => onChange({ plantRevision: next === 'latest' ? '' : String(plant?.revision ?? 1) });
  return (
    <View style={styles.choice}>
      <Text weight={600}>Plant</Text>
      {plants.length > 1 ? (
        <View style={styles.menu}>
          <Menu
            label={plant?.name ?? 'Choose a plant'}
            name="Plant"
            items={plants.map(({ id, name }) => ({
              key: id,
              label: name,
              current: id === plantId,
              onSelect: () => onChange({ plantId: id, plantRevision: '' }),
            }))}
          />
        </View>
      ) : (
        <Text>{`${plant?.name ?? 'No plant'}, rev ${plant?.revision ?? '–'}`}</Text>
      )}
      <Segments label="Revision of the plant" value={way} options={ways} onChange={choose} />
      {way === 'fixed' ? (
        <Field
          label="Revision"
          numeric
          compact
          inputMode="numeric"
          value={revision}
          error={error}
          hint={`1 to ${plant?.revision ?? 1}.`}
          onChangeText={(text) => onChange({ plantRevision: text === '' ? ' ' : text })}
        />
      ) : null}
    </View>
  );
}

const styles = StyleSheet.create({ choice: { gap: 8 }, menu: { alignSelf: 'flex-start', zIndex: 15 } });
