import { formatGain } from '@/figures/format';

/** A gain as it is printed; a controller without integral action has no Ti. */
export const gainText = (value: number | null): string => (value === null ? 'none' : formatGain(value));
