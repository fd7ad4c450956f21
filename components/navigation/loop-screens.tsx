import { type ComponentType, lazy, Suspense } from 'react';
import { Waiting } from '@/components/ui/waiting';
import { PageBoundary } from './page-boundary';

type OnDemand = typeof import('@/components/on-demand');

/** Fetches what draws a loop, once. */
export const fetchLoopScreens = (): Promise<OnDemand> => import('@/components/on-demand');

/** A screen that draws a loop: it comes with the engine, the figures and the charts when the first of them is opened. */
function onDemand<Props extends object>(choose: (screens: OnDemand) => ComponentType<Props>) {
  const Screen = lazy(async () => ({ default: choose(await fetchLoopScreens()) as ComponentType<object> }));
  return function OnDemand(props: Props) {
    return (
      <PageBoundary>
        <Suspense fallback={<Waiting text="Fetching the charts" />}>
          <Screen {...props} />
        </Suspense>
      </PageBoundary>
    );
  };
}

export const BenchScreen = onDemand((screens) => screens.BenchScreen);
export const PlantScreen = onDemand((screens) => screens.PlantScreen);
export const AnalysisScreen = onDemand((screens) => screens.AnalysisScreen);
export const LatestPlane = onDemand((screens) => screens.LatestPlane);
export const CasesScreen = onDemand((screens) => screens.CasesScreen);
export const LimitsScreen = onDemand((screens) => screens.LimitsScreen);
