import { StyleSheet, View } from 'react-native';
import { Button } from '@/components/ui/button';
import { Text } from '@/components/ui/text';
import { ruleRows } from '@/figures';
import { useIntegralSwitch } from './use-integral-switch';

/** Stands where the rule of Ti would, while there is no integral action. */
export function IntegralOff() {
  const { turn } = useIntegralSwitch();
  return (
    <View style={styles.row}>
      <Text step="note" tone="ink2" style={styles.text}>
        No integral action.
      </Text>
      <View>
        <Button label="Switch it on" onPress={() => turn(true)} />
      </View>
    </View>
  );
}

const styles = StyleSheet.create({
  row: { flexDirection: 'row', alignItems: 'center', gap: 12, height: ruleRows.height },
  text: { flexShrink: 1 },
});
