type Named = readonly (readonly [RegExp, string])[];

/** Order matters: browsers name their ancestors, and phones the desktop they are made from. */
const browsers: Named = [
  [/Edg(e|A|iOS)?\//, 'Edge'],
  [/OPR\//, 'Opera'],
  [/SamsungBrowser\//, 'Samsung Internet'],
  [/Firefox\/|FxiOS\//, 'Firefox'],
  [/Chrome\/|CriOS\//, 'Chrome'],
  [/Safari\//, 'Safari'],
];
const systems: Named = [
  [/iPhone/, 'iPhone'],
  [/iPad/, 'iPad'],
  [/Android/, 'Android'],
  [/Windows/, 'Windows'],
  [/Mac OS X|Macintosh/, 'Mac'],
  [/CrOS/, 'ChromeOS'],
  [/Linux/, 'Linux'],
];

const firstOf = (named: Named, userAgent: string) => named.find(([pattern]) => pattern.test(userAgent))?.[1];

/** A device in words, from what its browser says of itself: "Firefox on Android". */
export function deviceName(userAgent: string | null): string {
  const browser = firstOf(browsers, userAgent ?? '');
  const system = firstOf(systems, userAgent ?? '');
  if (browser && system) return `${browser} on ${system}`;
  return browser ?? system ?? 'Unknown device';
}
