import { z } from 'zod';
import { Id } from '@/contract';

/** Parameters that many paths share. */
export const inProject = z.object({ projectId: Id });
export const revisionNumber = z.coerce.number().int().min(1).max(1e9);
