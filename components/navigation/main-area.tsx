import type { PropsWithChildren } from 'react';
import { View } from 'react-native';
import { PageBoundary } from './page-boundary';

/** The page's own part, between the bars. */
export function MainArea({ children }: PropsWithChildren) {
  return (
    <View role="main" style={{ flex: 1, minHeight: 0 }}>
      <PageBoundary>{children}</PageBoundary>
    </View>
  );
}
