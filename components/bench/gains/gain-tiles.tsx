import { useRef } from 'react';
import { StyleSheet, View } from 'react-native';
import { IconButton } from '@/components/ui/icon-button';
import { useTheme } from '@/components/ui/theme';
import { useDraft, useSettings } from '../bench-context';
import { writtenIn, sameGain } from '../draft/form';
import { type Gain, gains, gainWords } from '../draft/gain';
import { GainTile } from './gain-tile';

interface GainTilesProps {
  active: Gain;
  onChoose: (gain: Gain) => void;
  onSettings: () => void;
}

const steps: Readonly<Record<string, number>> = { ArrowRight: 1, ArrowLeft: -1 };

/** The gains side by side, one of them active; at the end the way to all settings. */
export function GainTiles({ active, onChoose, onSettings }: GainTilesProps) {
  const { colors } = useTheme();
  const settings = useSettings();
  const base = useDraft((draft) => draft.base.settings);
  const kept = writtenIn(settings.form, base);
  const row = useRef<View>(null);
  const walk = (event: KeyboardEvent) => {
    const step = steps[event.key];
    if (!step) return;
    event.preventDefault();
    const next = (gains.indexOf(active) + step + gains.length) % gains.length;
    onChoose(gains[next]);
    (row.current as unknown as HTMLElement).querySelectorAll<HTMLElement>('[role=radio]')[next].focus();
  };
  return (
    <View style={[styles.row, { backgroundColor: colors.bar }]}>
      <View ref={row} role="radiogroup" aria-label="Gain that rule and nudges move" style={styles.tiles} onKeyDown={walk}>
        {gains.map((gain) => (
          <GainTile
            key={gain}
            gain={gain}
            label={gainWords(gain, settings.form).label}
            value={settings[gain]}
            moved={'refusal' in kept || !sameGain(settings[gain], kept.gains[gain])}
            active={gain === active}
            onChoose={onChoose}
          />
        ))}
      </View>
      <IconButton icon="more" label="All settings" onPress={onSettings} />
    </View>
  );
}

const styles = StyleSheet.create({
  row: { flexDirection: 'row', alignItems: 'center', paddingRight: 4 },
  tiles: { flexDirection: 'row', flex: 1 },
});
