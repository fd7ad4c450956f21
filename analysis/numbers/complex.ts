/** A complex number as plain data. Hot loops work on separate re and im values instead and allocate nothing. */
export interface Complex {
  readonly re: number;
  readonly im: number;
}
