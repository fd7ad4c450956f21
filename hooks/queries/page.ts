/** How every list answers. */
export interface Page<Item> {
  items: Item[];
  nextCursor: string | null;
}

export const query = (parameters: Readonly<Record<string, string | null | undefined>>): string => {
  const given = Object.entries(parameters).filter((entry): entry is [string, string] => Boolean(entry[1]));
  return given.length === 0 ? '' : `?${new URLSearchParams(given)}`;
};
