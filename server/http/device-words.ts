type Words = readonly (readonly [RegExp, string])[];

/** First match counts: most browsers also name the ones they descend from. */
const browsers: Words = [
  [/\bEdg(e|A|iOS)?\//, 'Edge'],
  [/\bOPR\//, 'Opera'],
  [/\bSamsungBrowser\//, 'Samsung Internet'],
  [/\b(Firefox|FxiOS)\//, 'Firefox'],
  [/\b(Chrome|Chromium|CriOS|HeadlessChrome)\//, 'Chrome'],
  [/\bSafari\//, 'Safari'],
];
const systems: Words = [
  [/\b(iPhone|iPod)\b/, 'iPhone'],
  [/\biPad\b/, 'iPad'],
  [/\bAndroid\b/, 'Android'],
  [/\bCrOS\b/, 'ChromeOS'],
  [/\bWindows\b/, 'Windows'],
  [/\bMac OS X\b|\bMacintosh\b/, 'Mac'],
  [/\bLinux\b/, 'Linux'],
];

const named = (words: Words, text: string, otherwise: string): string =>
  words.find(([pattern]) => pattern.test(text))?.[1] ?? otherwise;

/** A browser's own account of itself in words a person recognises: `Firefox on Linux`. */
export const deviceWords = (userAgent: string | undefined): string => {
  const text = (userAgent ?? '').slice(0, 400);
  return `${named(browsers, text, 'A browser')} on ${named(systems, text, 'some device')}`;
};
