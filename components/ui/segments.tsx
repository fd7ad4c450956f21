import { useRef } from 'react';
import { Pressable, StyleSheet, View } from 'react-native';
import { Text } from './text';
import { useTheme } from './theme';
import { line, touch } from './tokens';

export interface SegmentsProps<Value extends string> {
  label: string;
  value: Value;
  options: readonly { value: Value; label: string }[];
  onChange: (value: Value) => void;
  stretch?: boolean;
}

const steps: Readonly<Record<string, number>> = { ArrowRight: 1, ArrowDown: 1, ArrowLeft: -1, ArrowUp: -1 };

/** Two or three choices of one setting, as a group of radio buttons: one stop for Tab, arrows change the choice. */
export function Segments<Value extends string>({ label, value, options, onChange, stretch = false }: SegmentsProps<Value>) {
  const { colors } = useTheme();
  const group = useRef<View>(null);
  const move = (event: KeyboardEvent) => {
    const step = steps[event.key];
    if (!step) return;
    event.preventDefault();
    const at = options.findIndex((option) => option.value === value);
    const next = (at + step + options.length) % options.length;
    onChange(options[next].value);
    (group.current as unknown as HTMLElement).querySelectorAll<HTMLElement>('[role=radio]')[next].focus();
  };
  return (
    <View ref={group} role="radiogroup" aria-label={label} style={[styles.group, stretch && styles.stretch]} onKeyDown={move}>
      {options.map((option, index) => {
        const chosen = option.value === value;
        return (
          <Pressable
            key={option.value}
            role="radio"
            aria-checked={chosen}
            tabIndex={chosen ? 0 : -1}
            onPress={() => onChange(option.value)}
            style={[
              styles.option,
              index > 0 && styles.joined,
              stretch && styles.share,
              { borderColor: chosen ? colors.ink : colors.rule2, backgroundColor: chosen ? colors.ink : colors.paper },
            ]}
          >
            <Text weight={chosen ? 600 : 500} tone={chosen ? 'paper' : 'ink'} numberOfLines={1}>
              {option.label}
            </Text>
          </Pressable>
        );
      })}
    </View>
  );
}

const styles = StyleSheet.create({
  group: { flexDirection: 'row', alignSelf: 'flex-start' },
  stretch: { alignSelf: 'stretch' },
  share: { flex: 1, paddingHorizontal: 6 },
  option: {
    minHeight: touch,
    minWidth: 60,
    paddingHorizontal: 14,
    borderWidth: line.field,
    alignItems: 'center',
    justifyContent: 'center',
  },
  joined: { marginLeft: -line.field },
});
