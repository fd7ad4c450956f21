const two = (value: number) => String(value).padStart(2, '0');
const months = 'January February March April May June July August September October November December'.split(' ');

/** 21:58 */
export const clock = (moment: Date): string => `${two(moment.getHours())}:${two(moment.getMinutes())}`;

const day = (moment: Date): string => `${moment.getDate()} ${months[moment.getMonth()]}`;

const sameDay = (a: Date, b: Date): boolean => a.toDateString() === b.toDateString();

/** The shortest name of a moment: "21:58" today, "2 May" this year, "2 May 2025" before; with the time of day where it is asked for. */
export function moment(iso: string, now: Date, withClock = false): string {
  const at = new Date(iso);
  if (sameDay(at, now)) return withClock ? `today ${clock(at)}` : clock(at);
  const date = at.getFullYear() === now.getFullYear() ? day(at) : `${day(at)} ${at.getFullYear()}`;
  return withClock ? `${date} ${clock(at)}` : date;
}

const MINUTE_MS = 60_000;

/** "just now", "2 min ago", then the moment itself. */
export function ago(iso: string, now: Date): string {
  const minutes = Math.floor((now.getTime() - new Date(iso).getTime()) / MINUTE_MS);
  if (minutes < 1) return 'just now';
  return minutes < 60 ? `${minutes} min ago` : moment(iso, now, true);
}
