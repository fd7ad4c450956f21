const isObject = (value: unknown): value is Record<string, unknown> => typeof value === 'object' && value !== null && !Array.isArray(value);

/** Whether two JSON values hold the same, whatever the order of their fields; a field that is undefined is not there. */
export function sameContent(a: unknown, b: unknown): boolean {
  if (Array.isArray(a) && Array.isArray(b)) return a.length === b.length && a.every((item, i) => sameContent(item, b[i]));
  if (!isObject(a) || !isObject(b)) return Object.is(a, b);
  return Object.keys({ ...a, ...b }).every((key) => sameContent(a[key], b[key]));
}
