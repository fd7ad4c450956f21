import { typographicMinus } from '@/figures/format';
import type { TimePanel } from './chart-types';

interface PlantUnits {
  readonly input: string;
  readonly output: string;
}

interface StepSizes {
  readonly reference: number;
  readonly load: number;
}

const sized = (size: number, unit: string): string => `${typographicMinus(String(size))}${unit ? ` ${unit}` : ''}`;

/** The panels of the time sheets. A title says what is shown after what, and where a load enters. */
export function timePanels(units: PlantUnits, { reference, load }: StepSizes): Readonly<Record<TimePanel['kind'], TimePanel>> {
  return {
    reference: { kind: 'reference', title: `Output after a ${sized(reference, units.output)} step`, unit: units.output, height: 1.3 },
    load: { kind: 'load', title: `Output after a ${sized(load, units.input)} load at the command`, unit: units.output },
    control: { kind: 'control', title: 'Command for the step', unit: units.input },
  };
}
