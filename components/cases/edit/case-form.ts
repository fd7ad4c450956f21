import type { Case, CaseBasis } from '@/contract';
import { axisTyped } from '@/figures/axis-text';
import type { SpeedUnit } from '@/figures/units';

/** The fields of one case, as they were typed. */
export interface CaseForm {
  name: string;
  plantId: string;
  /** "" is the latest revision. */
  plantRevision: string;
  /** What stands in place of the plant's own, by name; "" leaves the plant's own. */
  parameters: Record<string, string>;
  speed: string;
  mass: string;
  grade: string;
  basis: CaseBasis;
  /** The unit in which the speed was typed: a draft keeps it, whatever is chosen meanwhile. */
  speedUnit: SpeedUnit;
}

export const emptyCaseForm = (plantId: string, speedUnit: SpeedUnit): CaseForm => ({
  name: '',
  plantId,
  plantRevision: '',
  parameters: {},
  speed: '',
  mass: '',
  grade: '',
  basis: 'extrapolated',
  speedUnit,
});

/** A kept case as the form shows it. */
export function caseForm({ name, plantId, plantRevision, parameters, axes, basis }: Case, speedUnit: SpeedUnit): CaseForm {
  const typed = (axis: 'speed' | 'mass' | 'grade') => (axes[axis] === undefined ? '' : axisTyped(axis, axes[axis], speedUnit));
  return {
    name,
    plantId,
    plantRevision: plantRevision === null ? '' : String(plantRevision),
    parameters: Object.fromEntries(Object.entries(parameters).map(([key, value]) => [key, String(value)])),
    speed: typed('speed'),
    mass: typed('mass'),
    grade: typed('grade'),
    basis,
    speedUnit,
  };
}

const isText = (value: unknown): value is string => typeof value === 'string';

/** Whether something that was kept on this device is a form, and not what an older version kept. */
export function isCaseForm(value: unknown): value is CaseForm {
  if (typeof value !== 'object' || value === null) return false;
  const form = value as Record<string, unknown>;
  const texts = ['name', 'plantId', 'plantRevision', 'speed', 'mass', 'grade', 'basis', 'speedUnit'].every((field) => isText(form[field]));
  return texts && typeof form.parameters === 'object' && form.parameters !== null && Object.values(form.parameters).every(isText);
}
