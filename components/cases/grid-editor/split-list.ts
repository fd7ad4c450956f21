/**
 * Splits a list as people write it. Semicolons divide where there are any; else commas do where a blank follows one; else blanks
 * do, and a comma inside a number is a decimal comma; a list of bare commas is divided by them.
 *
 * @example splitList('30, 40, 80') // ['30', '40', '80']
 * @example splitList('0,17 0,14') // ['0,17', '0,14']
 */
export function splitList(text: string): string[] {
  const tidy = text.trim();
  if (tidy === '') return [];
  const pieces = tidy.includes(';')
    ? tidy.split(';')
    : /,\s/.test(tidy)
      ? tidy.split(/\s*,\s*|\s+/)
      : /\s/.test(tidy)
        ? tidy.split(/\s+/)
        : tidy.split(',');
  return pieces.map((piece) => piece.trim()).filter((piece) => piece !== '');
}

/** Stands in a list where the plant's own value holds. */
export const isOwn = (text: string): boolean => /^[-–—]?$/.test(text.trim());
