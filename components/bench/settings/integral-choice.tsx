import { View } from 'react-native';
import { Segments } from '@/components/ui/segments';
import { Text } from '@/components/ui/text';
import { useIntegralSwitch } from '../gains/use-integral-switch';

const options = [
  { value: 'on', label: 'On' },
  { value: 'off', label: 'Off' },
] as const;

/** No Ti says "no integral action": in the forms that have one it is switched. */
export function IntegralChoice() {
  const { offered, on, turn } = useIntegralSwitch();
  if (!offered) return null;
  return (
    <View style={{ gap: 6 }}>
      <Text weight={600}>Integral action</Text>
      <Segments label="Integral action" value={on ? 'on' : 'off'} options={options} onChange={(value) => turn(value === 'on')} />
    </View>
  );
}
