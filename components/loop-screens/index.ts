/** Everything that draws a loop; imported as one piece by components/navigation/loop-screens. */
export { Bench as BenchScreen } from '@/components/bench';
export { PlantScreen } from '@/components/plants/plant-screen';
export { AnalysisScreen } from '@/components/analyses/analysis-screen';
export { LatestPlane } from '@/components/home/latest-plane';
