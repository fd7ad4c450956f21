import { View } from 'react-native';
import { Button } from './button';
import { Link } from './link';
import { Heading, Text } from './text';

export interface TroubleProps {
  title: string;
  text: string;
  onRetry?: () => void;
}

/** What went wrong and what can be done: try again, or go to the projects. */
export function Trouble({ title, text, onRetry }: TroubleProps) {
  return (
    <View role="alert" style={{ padding: 20, gap: 8, alignItems: 'flex-start' }}>
      <Heading level={2}>{title}</Heading>
      <Text tone="ink2">{text}</Text>
      {onRetry ? <Button label="Try again" onPress={onRetry} /> : <Link href="/">All projects</Link>}
    </View>
  );
}
