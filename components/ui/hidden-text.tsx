import { Text } from './text';

/** Words for those who listen, where the eye has a picture. */
export function HiddenText({ id, children }: { id?: string; children: string }) {
  return (
    <Text id={id} style={{ position: 'absolute', width: 1, height: 1, overflow: 'hidden', opacity: 0 }}>
      {children}
    </Text>
  );
}
