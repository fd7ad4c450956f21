import { Pressable, type PressableProps, StyleSheet } from 'react-native';
import { Icon, type IconName } from './icon';
import { useTheme } from './theme';
import { corner, line } from './tokens';

export interface IconButtonProps extends Omit<PressableProps, 'children' | 'style'> {
  label: string;
  icon: IconName;
  outlined?: boolean;
}

/** A button whose picture says it all to the eye; `label` says it to everyone else. */
export function IconButton({ label, icon, outlined = false, disabled, ...rest }: IconButtonProps) {
  const { colors } = useTheme();
  const edge = outlined ? (disabled ? colors.rule : colors.rule2) : 'transparent';
  return (
    <Pressable
      role="button"
      {...rest}
      disabled={disabled}
      aria-label={label}
      style={({ pressed }) => [
        styles.box,
        { borderColor: edge, backgroundColor: outlined ? colors.paper : 'transparent' },
        pressed && styles.pressed,
      ]}
    >
      <Icon name={icon} tone={disabled ? 'ink3' : 'ink'} />
    </Pressable>
  );
}

const styles = StyleSheet.create({
  box: { width: 48, height: 48, borderWidth: line.field, borderRadius: corner, alignItems: 'center', justifyContent: 'center' },
  pressed: { opacity: 0.7 },
});
