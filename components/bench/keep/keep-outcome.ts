import { type ReaderUnits, quantityName, quantityText } from '@/figures/quantity-text';
import type { Agreement } from './agreement';

/** Where keeping stands. */
export type KeepOutcome =
  | { readonly kind: 'idle' }
  | { readonly kind: 'keeping' }
  | { readonly kind: 'kept'; readonly revision: number; readonly agreement: Agreement | null }
  | { readonly kind: 'overtaken'; readonly detail: string }
  | { readonly kind: 'offline' }
  | { readonly kind: 'refused'; readonly detail: string };

export interface KeepWords {
  readonly lead: string;
  readonly text: string;
}

function agreementText(agreement: Agreement, units: ReaderUnits): string {
  if (agreement.kind === 'agree') return 'Server and bench agree to 6 digits.';
  const { quantity, bench, server } = agreement;
  if (quantity === 'stability') {
    return `Server and bench differ: ${server} and ${bench} poles on the wrong side. The server's number counts. Tell us.`;
  }
  const printed = (value: number | null) => (value === null ? 'none' : quantityText(quantity, value, units).text);
  // Where the printed digits hide the difference, all of them are shown.
  const alike = printed(server) === printed(bench);
  const [theirs, ours] = alike ? [String(server), String(bench)] : [printed(server), printed(bench)];
  return `Server and bench differ: ${quantityName(quantity)} ${theirs} and ${ours}. The server's number counts. Tell us.`;
}

/** What there is to say of keeping; null where there is nothing. */
export function keepWords(outcome: KeepOutcome, units: ReaderUnits): KeepWords | null {
  switch (outcome.kind) {
    case 'kept': {
      const lead = `Kept as rev ${outcome.revision}.`;
      return { lead, text: outcome.agreement === null ? 'No analysis came with it.' : agreementText(outcome.agreement, units) };
    }
    case 'offline':
      return { lead: 'No signal.', text: 'The draft stays on this device; keeping it needs signal.' };
    case 'overtaken':
    case 'refused':
      return { lead: 'Not kept.', text: outcome.detail };
    default:
      return null;
  }
}
