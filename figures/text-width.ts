/** Advance widths of Archivo Narrow 500 in thousandths of the size, for the printable ASCII characters from space to ~, read from the font. */
const ADVANCES = [
  228, 242, 322, 456, 456, 729, 561, 169, 273, 273, 319, 479, 228, 273, 228, 228, 456, 456, 456, 456, 456, 456, 456, 456, 456, 456, 242,
  242, 479, 479, 479, 470, 822, 561, 561, 592, 592, 547, 501, 638, 592, 228, 425, 561, 470, 683, 592, 638, 547, 638, 592, 547, 501, 592,
  547, 774, 547, 547, 501, 242, 228, 242, 415, 456, 456, 456, 470, 425, 470, 456, 242, 470, 470, 228, 197, 425, 197, 698, 470, 470, 470,
  470, 288, 425, 242, 470, 425, 607, 425, 425, 410, 288, 218, 288, 479,
];
const FIRST = 32;
/** Minus, degree and accented letters lie near this. */
const OTHER = 479;
/** Weight 600, in which numbers are set, runs a little wider. */
const SEMIBOLD = 1.03;

/** Width of a text in the chart face, so that geometry needs no browser. */
export function textWidth(text: string, size = 13): number {
  let width = 0;
  for (let i = 0; i < text.length; i++) width += ADVANCES[text.charCodeAt(i) - FIRST] ?? OTHER;
  return (width / 1000) * size * SEMIBOLD;
}
