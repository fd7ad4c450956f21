import { View } from 'react-native';
import { Menu } from '@/components/ui/menu';
import { Text } from '@/components/ui/text';
import type { Compared } from '../compare/use-compared';
import type { ChangeLink } from '../subject/bench-link';

interface CompareChoiceProps {
  compared: Compared;
  onLink: ChangeLink;
}

/** Which kept revision lies beside as B, dashed. */
export function CompareChoice({ compared, onLink }: CompareChoiceProps) {
  const { revision, choices } = compared;
  const none = { key: 'none', label: 'Nothing', current: revision === null, onSelect: () => onLink({ b: 'none' }) };
  const items = choices.map((number) => ({
    key: String(number),
    label: `Rev ${number}`,
    current: revision?.revision === number,
    onSelect: () => onLink({ b: String(number) }),
  }));
  return (
    <View style={{ gap: 6, zIndex: 20 }}>
      <Text weight={600}>Laid beside, as B</Text>
      {choices.length === 0 ? (
        <Text step="note" tone="ink2">
          Nothing is kept yet that could lie beside.
        </Text>
      ) : (
        <View style={{ flexDirection: 'row' }}>
          <Menu label={revision === null ? 'Nothing' : `Rev ${revision.revision}`} items={[none, ...items]} />
        </View>
      )}
    </View>
  );
}
