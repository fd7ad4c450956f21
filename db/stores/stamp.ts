/** Who writes, and when. */
export interface Stamp {
  readonly by: string;
  readonly at: Date;
}

/** What a write adds to the project's history. */
export interface ActivityEntry {
  readonly id: string;
  readonly action: string;
  readonly summary: string;
  readonly detail: string | null;
}
