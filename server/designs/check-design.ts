import { caseLoop } from '@/analysis/project';
import type { DesignContent, PlantContent } from '@/contract';
import type { LoopPool } from '../jobs/loop-pool';

/** 1/(s + 1)²: falls so fast that no PID makes its loop meaningless, so what is refused is the design. */
const mildPlant: PlantContent = {
  plant: { kind: 'coefficients', numerator: [1], denominator: [1, 2, 1], deadTime: 0 },
  sensor: null,
  deadTimeBasis: null,
  delayBudget: [],
  units: { input: '', output: '' },
};

/** Whether the engine can compute this design at all, whatever the plant. @throws LoopRefused with a pointer into the design */
export async function checkDesign(jobs: LoopPool, design: DesignContent): Promise<void> {
  await jobs.analyse(caseLoop({ plant: mildPlant, parameters: {} }, design), { curves: false });
}
