import type { FirstBreak, Room, RoomWay } from '@/contract';
import { formatFactor, formatRoomMilliseconds, formatRoomPercent } from '@/figures/format';
import { demandedText, quantityName, type ReaderUnits } from '@/figures/quantity-text';

/** One way in which the loop may change, and what stops it first. */
export interface RoomLine {
  readonly way: keyof Room;
  /** "7 % more gain" */
  readonly change: string;
  /** "before Ms 1.70"; empty where nothing broke as far as was looked. */
  readonly before: string;
  /** The case in which it breaks; null where none does. */
  readonly caseName: string | null;
}

/** From twice the gain on a factor reads better than per cent. */
const asMoreGain = (factor: number) =>
  factor < 2 ? formatRoomPercent(factor - 1) : `${formatFactor(Math.floor(factor * 100) / 100)} times`;

const changes: readonly (readonly [keyof Room, (amount: number) => string, string])[] = [
  ['moreGain', asMoreGain, 'more gain'],
  ['lessGain', (factor) => formatRoomPercent(1 - factor), 'less gain'],
  ['moreDeadTime', formatRoomMilliseconds, 'more dead time'],
];

const limitWords = ({ quantity, limit }: FirstBreak, units: ReaderUnits): string | null =>
  quantity === null ? null : `${quantityName(quantity)}${limit === null ? '' : ` ${demandedText(quantity, limit, units)}`}`;

function line(way: RoomWay, [key, amount, words]: (typeof changes)[number], units: ReaderUnits): RoomLine {
  const first = way.any ?? way.instability;
  if (first === null) return { way: key, change: `over ${amount(way.lookedTo)} ${words}`, before: '', caseName: null };
  const limit = limitWords(first, units);
  const shared = { way: key, caseName: first.case.name };
  // Less than is shown is none: what would break is all but reached, or was passed before.
  if (first.amount === (key === 'moreDeadTime' ? 0 : 1))
    return { ...shared, change: `no ${words}`, before: limit === null ? 'without being unstable' : `within ${limit}` };
  return { ...shared, change: `${amount(first.amount)} ${words}`, before: `before ${limit ?? 'it is unstable'}` };
}

const stopOf = ({ before, caseName }: RoomLine): string => [before, caseName].filter(Boolean).join(', ');

/** All ways in one sentence: what breaks at the same limit is said together. "7 % more gain or 16 ms more dead time before Ms 1.70" */
export function roomSentence(lines: readonly RoomLine[]): string {
  const stops = [...new Set(lines.map(stopOf))];
  const parts = stops.map((stop) => {
    const together = lines.filter((one) => stopOf(one) === stop).map(({ change }) => change);
    return [together.join(' or '), stop].filter(Boolean).join(' ');
  });
  return `${parts.join('; ')}.`;
}

/** The same places, while the room is looked for. */
const sought: readonly RoomLine[] = changes.map(([way, , words]) => ({ way, change: `… ${words}`, before: '', caseName: null }));

/** What may change, one at a time, before the first limit breaks in any case. Amounts are rounded down: never more than there is. */
export const roomLines = (room: Room | 'sought', units: ReaderUnits): readonly RoomLine[] =>
  room === 'sought' ? sought : changes.map((change) => line(room[change[0]], change, units));
