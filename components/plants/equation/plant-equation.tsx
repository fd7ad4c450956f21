import { StyleSheet, View } from 'react-native';
import { Text } from '@/components/ui/text';
import { useTheme } from '@/components/ui/theme';
import { equationParts } from './equation-parts';
import { Fraction, Mathematics } from './fraction';
import { readBack, type ReadablePlant } from './read-back';
import { spokenEquation } from './spoken-mathematics';

interface PlantEquationProps {
  plant: ReadablePlant;
  /** What is typed says another plant, which cannot be read. */
  outdated?: boolean;
}

/** P(s) typeset, and read back in words: poles, zeros, gain and dead time. */
export function PlantEquation({ plant, outdated = false }: PlantEquationProps) {
  const { colors } = useTheme();
  const read = readBack(plant);
  if (!read) return null;
  const parts = equationParts(plant.plant.kind, read);
  const { over, under, delay } = parts;
  return (
    <View style={[styles.box, { backgroundColor: colors.bar }]}>
      {outdated ? (
        <Text step="note" weight={600}>
          The last that could be read:
        </Text>
      ) : null}
      <View role="img" aria-label={spokenEquation(parts)} style={styles.line}>
        <Mathematics text="P(s) =" />
        {under === '1' ? <Mathematics text={over} /> : <Fraction over={over} under={under} />}
        {delay ? (
          <View style={styles.delay}>
            <Mathematics text="·" />
            <Text step="h2" weight={500} style={{ fontStyle: 'italic' }}>
              e
            </Text>
            <View style={styles.exponent}>
              <Mathematics text={delay} small />
            </View>
          </View>
        ) : null}
      </View>
      <Text step="prose" tone="ink2">
        {read.words}
      </Text>
    </View>
  );
}

const styles = StyleSheet.create({
  box: { padding: 16, gap: 12 },
  line: { flexDirection: 'row', alignItems: 'center', flexWrap: 'wrap', gap: 10, rowGap: 6 },
  delay: { flexDirection: 'row', alignItems: 'center', gap: 4 },
  exponent: { marginBottom: 16 },
});
