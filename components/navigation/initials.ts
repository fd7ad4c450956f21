/** The first letters of a first and a last name. */
export function initials(name: string): string {
  const letters = name
    .split(/\s+/)
    .filter(Boolean)
    .map((word) => Array.from(word)[0].toUpperCase());
  return letters.length > 1 ? letters[0] + letters[letters.length - 1] : (letters[0] ?? '–');
}
