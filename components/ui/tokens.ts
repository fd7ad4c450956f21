/** Colours by role, type steps, spaces and breakpoints. Sizes are CSS pixels. The role says what a colour is for, never what it looks like. */

const light = {
  desk: '#E6ECE6',
  paper: '#FFFFFF',
  bar: '#EFF5EF',
  ink: '#0F1F1A',
  ink2: '#3F5049',
  ink3: '#586860',
  rule: '#D0DAD2',
  rule2: '#78877F',
  kerb: '#D0251A',
  kerbGap: '#FFFFFF',
  pass: '#08636E',
  tight: '#8A5200',
  fail: '#B0151A',
  tightFill: '#FFC733',
  tightEdge: '#8A5200',
  onTight: '#0F1F1A',
  failFill: '#B0151A',
  onFail: '#FFFFFF',
  tightTint: '#FFEFC2',
  failTint: '#FBD9D5',
  notJudged: '#586860',
  b: '#4A3CC2',
  contour: '#B28555',
  contourText: '#86592A',
  focus: '#1447D6',
};

export type Palette = Readonly<Record<keyof typeof light, string>>;
export type ThemeName = 'light' | 'dark';

const dark: Palette = {
  desk: '#070C0A',
  paper: '#101815',
  bar: '#172220',
  ink: '#EFF5F1',
  ink2: '#BECBC4',
  ink3: '#97A69E',
  rule: '#293631',
  rule2: '#6F7F77',
  kerb: '#FF5B47',
  kerbGap: '#FFFFFF',
  pass: '#63D0CB',
  tight: '#F6C050',
  fail: '#FF8273',
  tightFill: '#F6C050',
  tightEdge: '#F6C050',
  onTight: '#0F1F1A',
  failFill: '#FF7463',
  onFail: '#1A0503',
  tightTint: '#3A2E10',
  failTint: '#45160F',
  notJudged: '#97A69E',
  b: '#ACA6FF',
  contour: '#8C6B43',
  contourText: '#D0A672',
  focus: '#8FB4FF',
};

export const palettes: Readonly<Record<ThemeName, Palette>> = { light, dark };

/** A face has one family per weight, since the fonts are loaded so. `narrow` for numbers, headings, labels; `text` for running text. */
export const fonts = {
  narrow: {
    400: 'ArchivoNarrow_400Regular',
    500: 'ArchivoNarrow_500Medium',
    600: 'ArchivoNarrow_600SemiBold',
    700: 'ArchivoNarrow_700Bold',
  },
  text: { 400: 'Archivo_400Regular', 500: 'Archivo_500Medium', 600: 'Archivo_600SemiBold' },
} as const;

/** The type scale: size, line height and face. */
export const type = {
  hero: { fontFamily: fonts.narrow[700], fontSize: 44, lineHeight: 40 },
  big: { fontFamily: fonts.narrow[700], fontSize: 30, lineHeight: 32 },
  h1: { fontFamily: fonts.narrow[600], fontSize: 28, lineHeight: 32 },
  h2: { fontFamily: fonts.narrow[600], fontSize: 20, lineHeight: 23 },
  h3: { fontFamily: fonts.narrow[600], fontSize: 17, lineHeight: 21 },
  value: { fontFamily: fonts.narrow[600], fontSize: 21, lineHeight: 23 },
  body: { fontFamily: fonts.narrow[500], fontSize: 16, lineHeight: 20 },
  note: { fontFamily: fonts.narrow[500], fontSize: 15, lineHeight: 20 },
  small: { fontFamily: fonts.narrow[500], fontSize: 14, lineHeight: 17 },
  tick: { fontFamily: fonts.narrow[500], fontSize: 13, lineHeight: 15 },
  prose: { fontFamily: fonts.text[400], fontSize: 15, lineHeight: 22 },
} as const;
export type TypeStep = keyof typeof type;

export const space = { xs: 4, s: 6, m: 8, l: 12, xl: 16, xxl: 20, gap: 26, section: 34 } as const;
export const gutter = { phone: 12, wide: 20 } as const;
export const corner = 4;
export const line = { hair: 1, field: 1.5, head: 1.5 } as const;
/** The least size of anything that is touched. */
export const touch = 44;

/** From these widths on the layout has two columns (`middle`) or the whole desk (`wide`). */
export const breakpoints = { middle: 700, wide: 1200 } as const;

/** Milliseconds: everything that moves; and how long a wait stays unsaid. */
export const motion = { quick: 120, sheet: 180, quietWaitMs: 400 } as const;
