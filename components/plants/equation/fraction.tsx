import { StyleSheet, View } from 'react-native';
import { Text } from '@/components/ui/text';
import { useTheme } from '@/components/ui/theme';

/** A line ends between two brackets, never in one. */
const unbroken = (text: string): string =>
  text.replace(/\([^)]*\)/g, (bracket) => bracket.replaceAll(' ', '\u00a0')).replaceAll(')(', ')\u200b(');

/** Text in which every s, the variable, leans. */
export function Mathematics({ text, small = false }: { text: string; small?: boolean }) {
  const step = small ? 'body' : 'h2';
  return (
    <Text step={step} weight={500} style={styles.centred}>
      {unbroken(text)
        .split(/(s)/)
        .map((piece, i) => (
          <Text key={i} step={step} weight={500} style={piece === 's' && styles.variable}>
            {piece}
          </Text>
        ))}
    </Text>
  );
}

export function Fraction({ over, under }: { over: string; under: string }) {
  const { colors } = useTheme();
  return (
    <View style={styles.fraction}>
      <Mathematics text={over} />
      <View style={[styles.bar, { backgroundColor: colors.ink }]} />
      <Mathematics text={under} />
    </View>
  );
}

const styles = StyleSheet.create({
  centred: { textAlign: 'center' },
  variable: { fontStyle: 'italic' },
  fraction: { alignItems: 'center', gap: 4, flexShrink: 1 },
  bar: { height: 1.5, alignSelf: 'stretch', minWidth: 40 },
});
