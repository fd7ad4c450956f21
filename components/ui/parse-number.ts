const plain = /^[+-]?(\d+\.?\d*|\.\d+)(e[+-]?\d+)?$/i;

/** A number as people write it: a comma or a point before decimals, a hyphen or a real minus, spaces round it. `null` where it is none. */
export function parseNumber(text: string): number | null {
  const tidy = text.trim().replace(/[−–]/g, '-').replace(',', '.');
  if (!plain.test(tidy)) return null;
  const value = Number(tidy);
  return Number.isFinite(value) ? value : null;
}
