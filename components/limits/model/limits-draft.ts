import { z } from 'zod';
import { Limit, Preferences, Quantity } from '@/contract';
import { forget, keep, recall } from '@/hooks/device-store';
import type { LimitsEdit } from './limits-edit';

const Typed = z.object({ text: z.string(), value: z.number().nullable() });
const Row = z.object({ quantity: Quantity, bound: Limit.shape.bound, limit: Typed, target: Typed, source: z.string() });
const Draft = z.object({
  base: z.object({ etag: z.string().nullable(), items: z.array(Limit) }),
  rows: z.array(Row),
  units: z.object({ frequency: Preferences.shape.frequencyUnit, magnitude: Preferences.shape.magnitudeUnit }),
});

const keyOf = (projectId: string) => `draft.limits.${projectId}`;

/** What was typed on this device and not kept; null where there is nothing, or nothing that can be read. */
export function recallLimitsDraft(projectId: string): LimitsEdit | null {
  const { success, data } = Draft.safeParse(recall(keyOf(projectId)));
  return success ? { ...data, past: [], typing: null } : null;
}

export const keepLimitsDraft = (projectId: string, { base, rows, units }: LimitsEdit): void =>
  keep(keyOf(projectId), { base, rows, units });

export const forgetLimitsDraft = (projectId: string): void => forget(keyOf(projectId));
