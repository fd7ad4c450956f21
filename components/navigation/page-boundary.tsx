import { usePathname } from 'expo-router';
import { Component, type PropsWithChildren } from 'react';
import { Trouble } from '@/components/ui/trouble';
import { useSignal } from '@/hooks/use-signal';

/** Keeps a page that could not be fetched or drawn from taking the others with it; going elsewhere tries anew. */
export function PageBoundary({ children }: PropsWithChildren) {
  const pathname = usePathname();
  return <Boundary pathname={pathname}>{children}</Boundary>;
}

class Boundary extends Component<PropsWithChildren<{ pathname: string }>, { failed: boolean }> {
  override state = { failed: false };

  static getDerivedStateFromError() {
    return { failed: true };
  }

  override componentDidUpdate(before: { pathname: string }) {
    if (this.state.failed && before.pathname !== this.props.pathname) this.setState({ failed: false });
  }

  override render() {
    return this.state.failed ? <PageTrouble /> : this.props.children;
  }
}

/** Without signal a reload would lose what is open, so it is not offered. */
function PageTrouble() {
  const signal = useSignal();
  if (!signal) return <Trouble title="No signal" text="This page was not opened before, so there is nothing to show yet." />;
  return <Trouble title="This page did not load" text="Your drafts are still on this device." onRetry={() => window.location.reload()} />;
}
