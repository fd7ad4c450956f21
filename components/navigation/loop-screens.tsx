import { type ComponentType, lazy, Suspense } from 'react';
import { Waiting } from '@/components/ui/waiting';

type LoopScreens = typeof import('@/components/loop-screens');

/**
 * The engine, the figures and the charts come in one piece, with the first page that draws a loop. One piece, because what several pieces
 * share would be moved into the first load.
 */
const load = () => import('@/components/loop-screens');

function onDemand<Props extends object>(choose: (screens: LoopScreens) => ComponentType<Props>) {
  const Screen = lazy(async () => ({ default: choose(await load()) as ComponentType<object> }));
  return function OnDemand(props: Props) {
    return (
      <Suspense fallback={<Waiting text="Fetching the charts" />}>
        <Screen {...props} />
      </Suspense>
    );
  };
}

export const BenchScreen = onDemand((screens) => screens.BenchScreen);
export const PlantScreen = onDemand((screens) => screens.PlantScreen);
export const AnalysisScreen = onDemand((screens) => screens.AnalysisScreen);
export const LatestPlane = onDemand((screens) => screens.LatestPlane);
