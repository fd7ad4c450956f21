import { useEffect, useRef, useState } from 'react';
import { Pressable, StyleSheet, View } from 'react-native';
import { Button, type ButtonProps } from './button';
import type { IconName } from './icon';
import { IconButton } from './icon-button';
import { Text } from './text';
import { useTheme } from './theme';
import { corner, line, touch } from './tokens';

export interface MenuItem {
  key: string;
  label: string;
  hint?: string;
  current?: boolean;
  onSelect: () => void;
}

export interface MenuProps {
  label: string;
  /** What it is for, for those who listen, where `label` only says what is chosen. */
  name?: string;
  disabled?: boolean;
  /** A picture in the place of the label, for a row's own menu. */
  icon?: IconName;
  /** At the foot of a page the list rises out of its button. */
  rises?: boolean;
  /** Of its button, px, where several stand under each other. */
  width?: number;
  items: readonly MenuItem[];
  kind?: ButtonProps['kind'];
  align?: 'left' | 'right';
}

/** A button with a list under it. Down opens it, arrows walk it, Escape closes it and gives the focus back. */
export function Menu({ label, name, disabled, icon, rises = false, width, items, kind = 'secondary', align = 'left' }: MenuProps) {
  const { colors } = useTheme();
  const [open, setOpen] = useState(false);
  const box = useRef<View>(null);
  const element = () => box.current as unknown as HTMLElement;
  const close = () => {
    setOpen(false);
    element().querySelector('button')?.focus();
  };
  useEffect(() => {
    if (!open) return;
    const list = () => [...element().querySelectorAll<HTMLElement>('[role=menuitem]')];
    (list().find((item) => item.getAttribute('aria-current')) ?? list()[0])?.focus();
    const closeOutside = (event: PointerEvent) => {
      if (!element().contains(event.target as Node)) setOpen(false);
    };
    document.addEventListener('pointerdown', closeOutside);
    return () => document.removeEventListener('pointerdown', closeOutside);
  }, [open]);
  const walk = (event: KeyboardEvent) => {
    if (event.key === 'Escape' && open) return close();
    if (event.key === 'Tab') return setOpen(false);
    if (event.key !== 'ArrowDown' && event.key !== 'ArrowUp') return;
    event.preventDefault();
    if (!open) return setOpen(true);
    const list = [...element().querySelectorAll<HTMLElement>('[role=menuitem]')];
    const at = list.indexOf(document.activeElement as HTMLElement) + (event.key === 'ArrowDown' ? 1 : -1);
    list[(at + list.length) % list.length]?.focus();
  };
  const choose = (item: MenuItem) => {
    close();
    item.onSelect();
  };
  const trigger = { disabled, 'aria-haspopup': 'menu', 'aria-expanded': open, onPress: () => setOpen(!open) } as const;
  return (
    <View ref={box} style={[styles.box, { width }]} onKeyDown={walk}>
      {icon ? (
        <IconButton label={name ?? label} icon={icon} {...trigger} />
      ) : (
        <Button
          label={label}
          aria-label={name && `${name}, ${label}`}
          kind={kind}
          iconAfter="down"
          stretch={width !== undefined}
          {...trigger}
        />
      )}
      {open && (
        <View
          role="menu"
          aria-label={name ?? label}
          style={[
            styles.list,
            rises ? styles.above : styles.below,
            styles[align],
            { backgroundColor: colors.paper, borderColor: colors.ink },
          ]}
        >
          {items.map((item) => (
            <Pressable
              key={item.key}
              role="menuitem"
              tabIndex={-1}
              aria-current={item.current ? 'true' : undefined}
              onPress={() => choose(item)}
              style={({ hovered }) => [styles.item, (item.current || hovered) && { backgroundColor: colors.bar }]}
            >
              <Text weight={item.current ? 600 : 500}>{item.label}</Text>
              {item.hint ? (
                <Text step="small" tone="ink2">
                  {item.hint}
                </Text>
              ) : null}
            </Pressable>
          ))}
        </View>
      )}
    </View>
  );
}

const styles = StyleSheet.create({
  box: { zIndex: 20, alignSelf: 'center', maxWidth: '100%' },
  list: {
    position: 'absolute',
    minWidth: 240,
    maxHeight: 420,
    overflowY: 'auto',
    borderWidth: line.field,
    borderRadius: corner,
    zIndex: 20,
  },
  above: { bottom: touch + 2 },
  below: { top: touch + 2 },
  left: { left: 0 },
  right: { right: 0 },
  item: { minHeight: touch, justifyContent: 'center', paddingHorizontal: 14, paddingVertical: 8 },
});
