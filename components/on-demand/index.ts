/**
 * What comes after the first page, in one piece: everything that draws a loop, and the schemas that check a form. In one piece because
 * Metro moves what several pieces share into the first load. Only imported dynamically.
 */
export { Bench as BenchScreen } from '@/components/bench';
export { PlantScreen } from '@/components/plants/plant-screen';
export { AnalysisScreen } from '@/components/analyses/analysis-screen';
export { CasesScreen } from '@/components/cases/cases-screen';
export { LimitsScreen } from '@/components/limits/limits-screen';
export { LatestPlane } from '@/components/home/latest-plane';
export * as contract from '@/contract';
export { zodResolver } from '@hookform/resolvers/zod';
