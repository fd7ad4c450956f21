/** The part of mathjs that knows plain numbers only: its parser is all that is used, and it brings no types of its own. */
declare module 'mathjs/number' {
  export const parse: (expression: string) => unknown;
}
