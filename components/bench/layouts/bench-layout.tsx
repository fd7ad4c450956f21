import { useLayout } from '@/components/ui/use-layout';
import type { BenchLayoutProps } from './bench-actions';
import { PhoneBench } from './phone-bench';
import { WideBench } from './wide-bench';

/** The layout that the window is wide enough for. */
export function BenchLayout(props: BenchLayoutProps) {
  const layout = useLayout();
  return layout === 'phone' ? <PhoneBench {...props} /> : <WideBench {...props} paired={layout === 'middle'} />;
}
