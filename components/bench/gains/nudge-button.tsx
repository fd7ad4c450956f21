import { memo } from 'react';
import { Pressable, StyleSheet } from 'react-native';
import { Text } from '@/components/ui/text';
import { useTheme } from '@/components/ui/theme';
import { corner, line } from '@/components/ui/tokens';
import { typographicMinus } from '@/figures/format';

interface NudgeButtonProps {
  gainLabel: string;
  percent: number;
  disabled: boolean;
  onNudge: (fraction: number) => void;
}

/** One step of a gain, in reach of a thumb. */
export const NudgeButton = memo(function NudgeButton({ gainLabel, percent, disabled, onNudge }: NudgeButtonProps) {
  const { colors } = useTheme();
  const size = Math.abs(percent);
  return (
    <Pressable
      role="button"
      aria-label={`${gainLabel} ${percent > 0 ? 'up' : 'down'} ${size} %`}
      disabled={disabled}
      onPress={() => onNudge(percent / 100)}
      style={({ pressed }) => [
        styles.key,
        { borderColor: disabled ? colors.rule : colors.rule2, backgroundColor: pressed ? colors.bar : colors.paper },
      ]}
    >
      <Text step="note" weight={600} tone={disabled ? 'ink3' : 'ink'} numberOfLines={1}>
        {percent > 0 ? `+${size} %` : `${typographicMinus(String(percent))} %`}
      </Text>
    </Pressable>
  );
});

const styles = StyleSheet.create({
  key: { width: 48, height: 52, borderWidth: line.field, borderRadius: corner, alignItems: 'center', justifyContent: 'center' },
});
