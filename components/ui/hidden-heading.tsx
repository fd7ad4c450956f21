import { Heading } from './text';

/** The page's name for those who listen, where the eye already has it elsewhere. */
export function HiddenHeading({ children }: { children: string }) {
  return (
    <Heading level={1} style={{ position: 'absolute', width: 1, height: 1, overflow: 'hidden', opacity: 0 }}>
      {children}
    </Heading>
  );
}
