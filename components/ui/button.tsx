import { Pressable, type PressableProps, StyleSheet, View } from 'react-native';
import { Icon, type IconName } from './icon';
import { Text } from './text';
import { useTheme } from './theme';
import { corner, line, type Palette, touch } from './tokens';

type Kind = 'primary' | 'secondary' | 'quiet' | 'onInk';

export interface ButtonProps extends Omit<PressableProps, 'children' | 'style'> {
  label: string;
  kind?: Kind;
  icon?: IconName;
  iconAfter?: IconName;
  /** While it works the button keeps its width, cannot be pressed again and says what it does. */
  busy?: boolean;
  busyLabel?: string;
  tall?: boolean;
  stretch?: boolean;
}

const looks = (colors: Palette): Record<Kind, { background: string; edge: string; text: keyof Palette }> => ({
  primary: { background: colors.ink, edge: colors.ink, text: 'paper' },
  secondary: { background: colors.paper, edge: colors.rule2, text: 'ink' },
  quiet: { background: 'transparent', edge: 'transparent', text: 'ink' },
  onInk: { background: colors.paper, edge: colors.paper, text: 'ink' },
});

export function Button({
  label,
  kind = 'secondary',
  icon,
  iconAfter,
  busy = false,
  busyLabel,
  tall,
  stretch,
  disabled,
  ...rest
}: ButtonProps) {
  const { colors } = useTheme();
  const look = looks(colors)[kind];
  const idle = Boolean(disabled) && !busy;
  const off = {
    backgroundColor: kind === 'quiet' ? 'transparent' : colors.paper,
    borderColor: kind === 'quiet' ? 'transparent' : colors.rule,
  };
  const tone = idle ? 'ink3' : look.text;
  const on = { backgroundColor: look.background, borderColor: look.edge };
  return (
    <Pressable
      role="button"
      {...rest}
      disabled={disabled || busy}
      aria-disabled={disabled || busy || undefined}
      aria-busy={busy || undefined}
      style={({ pressed }) => [
        styles.box,
        idle ? off : on,
        tall && styles.tall,
        stretch ? styles.stretch : styles.hug,
        pressed && styles.pressed,
      ]}
    >
      <View style={styles.content}>
        {icon && <Icon name={icon} tone={tone} />}
        <Text weight={600} tone={tone} numberOfLines={1} style={styles.label}>
          {busy ? (busyLabel ?? label) : label}
        </Text>
        {iconAfter && (
          <View style={styles.icon}>
            <Icon name={iconAfter} tone={tone} size={16} />
          </View>
        )}
      </View>
    </Pressable>
  );
}

const styles = StyleSheet.create({
  box: {
    minHeight: touch,
    minWidth: touch,
    maxWidth: '100%',
    paddingHorizontal: 14,
    borderWidth: line.field,
    borderRadius: corner,
    justifyContent: 'center',
    alignItems: 'center',
  },
  tall: { minHeight: 52 },
  hug: { alignSelf: 'flex-start' },
  stretch: { alignSelf: 'stretch' },
  content: { flexDirection: 'row', alignItems: 'center', gap: 8, maxWidth: '100%' },
  label: { flexShrink: 1 },
  icon: { flexShrink: 0 },
  pressed: { opacity: 0.8 },
});
