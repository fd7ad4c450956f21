import { StyleSheet, View } from 'react-native';
import { describePlant, LoopError } from '@/analysis';
import { Text } from '@/components/ui/text';
import { useTheme } from '@/components/ui/theme';
import type { PlantContent } from '@/contract';
import { coefficientText, polynomialText } from './polynomial-text';

/** Text in which every s, the variable, leans. */
function Mathematics({ text, small = false }: { text: string; small?: boolean }) {
  return (
    <Text step={small ? 'body' : 'h2'} weight={500}>
      {text.split(/(s)/).map((piece, i) => (
        <Text key={i} step={small ? 'body' : 'h2'} weight={500} style={piece === 's' && { fontStyle: 'italic' }}>
          {piece}
        </Text>
      ))}
    </Text>
  );
}

function Fraction({ over, under }: { over: string; under: string }) {
  const { colors } = useTheme();
  return (
    <View style={styles.fraction}>
      <Mathematics text={over} />
      <View style={[styles.bar, { backgroundColor: colors.ink }]} />
      <Mathematics text={under} />
    </View>
  );
}

function describe(plant: PlantContent['plant']) {
  try {
    return describePlant(plant);
  } catch (error) {
    if (error instanceof LoopError) return null;
    throw error;
  }
}

/** P(s) typeset, and read back in words: poles, zeros, gain and dead time. */
export function PlantEquation({ plant }: { plant: PlantContent['plant'] }) {
  const { colors } = useTheme();
  const read = describe(plant);
  if (!read) return null;
  const over = polynomialText(read.numerator);
  const under = polynomialText(read.denominator);
  const delay = read.deadTime > 0 ? `−${coefficientText(read.deadTime)} s` : null;
  const spoken = `P of s is (${over}) over (${under})${delay ? `, times e to the power of ${delay}` : ''}`;
  return (
    <View style={[styles.box, { backgroundColor: colors.bar }]}>
      <View role="img" aria-label={spoken} style={styles.line}>
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
  fraction: { alignItems: 'center', gap: 4 },
  bar: { height: 1.5, alignSelf: 'stretch', minWidth: 40 },
  delay: { flexDirection: 'row', alignItems: 'center', gap: 4 },
  exponent: { marginBottom: 16 },
});
