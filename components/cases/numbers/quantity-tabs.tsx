import { useRef } from 'react';
import { Pressable, StyleSheet, View } from 'react-native';
import { Menu } from '@/components/ui/menu';
import { Text } from '@/components/ui/text';
import { useTheme } from '@/components/ui/theme';
import { touch } from '@/components/ui/tokens';
import { useLayout } from '@/components/ui/use-layout';
import type { Quantity } from '@/contract';
import { quantityName } from '@/figures/quantity-text';
import type { ShownQuantities } from '../model/shown-quantities';

interface QuantityTabsProps {
  quantities: ShownQuantities;
  current: Quantity;
  onChange: (quantity: Quantity) => void;
}

const MOST = { phone: 4, middle: 6, wide: 6 };
const steps: Readonly<Record<string, number>> = { ArrowRight: 1, ArrowDown: 1, ArrowLeft: -1, ArrowUp: -1 };
const short = (quantity: Quantity) => quantityName(quantity).replace(/ margin$/, '');

/** The tabs that there is room for; the number that is shown is always among them. */
function tabsOf({ first, rest }: ShownQuantities, current: Quantity, most: number): Quantity[] {
  const shown = [...first, ...rest].slice(0, most);
  return shown.includes(current) ? shown : [...shown.slice(0, most - 1), current];
}

/** Which number the grid, the list and the chart show: those with a limit first, the others behind "More". */
export function QuantityTabs({ quantities, current, onChange }: QuantityTabsProps) {
  const { colors } = useTheme();
  const layout = useLayout();
  const group = useRef<View>(null);
  const tabs = tabsOf(quantities, current, MOST[layout]);
  const others = [...quantities.first, ...quantities.rest].filter((quantity) => !tabs.includes(quantity));
  const move = (event: KeyboardEvent) => {
    const step = steps[event.key];
    if (!step) return;
    event.preventDefault();
    const next = (tabs.indexOf(current) + step + tabs.length) % tabs.length;
    onChange(tabs[next]);
    (group.current as unknown as HTMLElement).querySelectorAll<HTMLElement>('[role=radio]')[next].focus();
  };
  const phone = layout === 'phone';
  return (
    <View style={[styles.line, { borderBottomColor: colors.rule2 }]}>
      <View ref={group} role="radiogroup" aria-label="Number shown" style={styles.tabs} onKeyDown={move}>
        {tabs.map((quantity) => {
          const here = quantity === current;
          return (
            <Pressable
              key={quantity}
              role="radio"
              aria-checked={here}
              aria-label={quantityName(quantity)}
              tabIndex={here ? 0 : -1}
              onPress={() => onChange(quantity)}
              style={[styles.tab, phone ? styles.narrow : styles.roomy]}
            >
              <Text step="note" weight={here ? 700 : 500} tone={here ? 'ink' : 'ink2'} numberOfLines={1}>
                {short(quantity)}
              </Text>
              <View style={[styles.mark, { backgroundColor: here ? colors.ink : 'transparent' }]} />
            </Pressable>
          );
        })}
      </View>
      <Menu
        label="More"
        name="Other numbers"
        kind="quiet"
        align="right"
        items={others.map((quantity) => ({ key: quantity, label: quantityName(quantity), onSelect: () => onChange(quantity) }))}
      />
    </View>
  );
}

const styles = StyleSheet.create({
  line: { flexDirection: 'row', borderBottomWidth: 1, flexGrow: 1, zIndex: 12 },
  tabs: { flexDirection: 'row', flexGrow: 1, flexShrink: 1, minWidth: 0 },
  tab: { minHeight: touch, minWidth: touch, alignItems: 'center', justifyContent: 'center' },
  narrow: { flex: 1, paddingHorizontal: 2 },
  roomy: { paddingHorizontal: 16 },
  mark: { position: 'absolute', left: 0, right: 0, bottom: 0, height: 4 },
});
