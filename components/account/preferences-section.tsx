import { Note } from '@/components/ui/note';
import { Segments } from '@/components/ui/segments';
import { Heading, Text } from '@/components/ui/text';
import { formatFrequency, formatMagnitude } from '@/figures/format';
import { useMe, useUpdateMe } from '@/hooks/queries/me';
import { sentence } from '@/hooks/api/problem';
import { SettingRow } from './setting-row';

const frequencyUnits = [
  { value: 'rad/s', label: 'rad/s' },
  { value: 'Hz', label: 'Hz' },
] as const;
const magnitudeUnits = [
  { value: 'dB', label: 'dB' },
  { value: 'factor', label: 'factor' },
] as const;
const speedUnits = [
  { value: 'm/s', label: 'm/s' },
  { value: 'km/h', label: 'km/h' },
] as const;
const themes = [
  { value: 'light', label: 'light' },
  { value: 'dark', label: 'dark' },
  { value: 'system', label: 'system' },
] as const;
const onOff = [
  { value: 'on', label: 'on' },
  { value: 'off', label: 'off' },
] as const;

const exampleCrossover = 2.22;
const exampleGainMargin = 3.09;

/** Units, look and keys: chosen once, true on every page and every device. */
export function PreferencesSection() {
  const { preferences } = useMe();
  const update = useUpdateMe();
  const set = (change: Partial<typeof preferences>) => update.mutate({ preferences: change });
  const { frequencyUnit, magnitudeUnit } = preferences;
  const margin = `${formatMagnitude(exampleGainMargin, magnitudeUnit)}${magnitudeUnit === 'dB' ? ' dB' : ''}`;
  return (
    <>
      <Heading level={2}>Units, everywhere</Heading>
      <SettingRow name="Frequency">
        <Segments label="Frequency" value={frequencyUnit} options={frequencyUnits} onChange={(value) => set({ frequencyUnit: value })} />
      </SettingRow>
      <SettingRow name="Gain">
        <Segments label="Gain" value={magnitudeUnit} options={magnitudeUnits} onChange={(value) => set({ magnitudeUnit: value })} />
      </SettingRow>
      <SettingRow name="Speed">
        <Segments label="Speed" value={preferences.speedUnit} options={speedUnits} onChange={(value) => set({ speedUnit: value })} />
      </SettingRow>
      <Note>
        {`Example: crossover ${formatFrequency(exampleCrossover, frequencyUnit)} ${frequencyUnit}, gain margin ${margin}. Gains stay in the units of the control unit.`}
      </Note>
      <Heading level={2}>Look and keys</Heading>
      <SettingRow name="Theme" about="light is the one for sunlight">
        <Segments label="Theme" value={preferences.theme} options={themes} onChange={(theme) => set({ theme })} />
      </SettingRow>
      <SettingRow name="Keys on the bench" about="single letters, only while the bench has the focus">
        <Segments
          label="Keys on the bench"
          value={preferences.singleKeys ? 'on' : 'off'}
          options={onOff}
          onChange={(value) => set({ singleKeys: value === 'on' })}
        />
      </SettingRow>
      {update.error ? <Text tone="fail">{sentence(update.error)}</Text> : null}
    </>
  );
}
