import { useEffect, useState } from 'react';
import { View } from 'react-native';
import { Text } from './text';
import { motion } from './tokens';

/** One line of text about what is being waited for, shown only once the wait is long enough to be noticed. */
export function Waiting({ text }: { text: string }) {
  const [late, setLate] = useState(false);
  useEffect(() => {
    const timer = setTimeout(() => setLate(true), motion.quietWaitMs);
    return () => clearTimeout(timer);
  }, []);
  return (
    <View role="status" style={{ padding: 20, minHeight: 60 }}>
      {late ? <Text tone="ink2">{text}</Text> : null}
    </View>
  );
}
