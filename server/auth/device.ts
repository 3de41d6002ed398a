/** In this order: most browsers also name those that came before them. */
const BROWSERS: readonly [RegExp, string][] = [
  [/\bEdgA?\/|\bEdgiOS\//, 'Edge'],
  [/\bOPR\//, 'Opera'],
  [/\bSamsungBrowser\//, 'Samsung Internet'],
  [/\bFirefox\/|\bFxiOS\//, 'Firefox'],
  [/\bChrome\/|\bCriOS\/|\bHeadlessChrome\/|\bChromium\//, 'Chrome'],
  [/\bVersion\/[\d.]+ .*\bSafari\//, 'Safari'],
];
const SYSTEMS: readonly [RegExp, string][] = [
  [/\biPhone\b/, 'an iPhone'],
  [/\biPad\b/, 'an iPad'],
  [/\bAndroid\b/, 'Android'],
  [/\bWindows\b/, 'Windows'],
  [/\bCrOS\b/, 'ChromeOS'],
  [/\bMac OS X\b|\bMacintosh\b/, 'a Mac'],
  [/\bLinux\b/, 'Linux'],
];

/** What a User-Agent says, in plain words: "Firefox on Linux". */
export function deviceWords(userAgent: string | undefined): string {
  const named = (list: readonly [RegExp, string][]) =>
    list.find(([pattern]) => pattern.test(userAgent ?? ''))?.[1];
  const browser = named(BROWSERS);
  const system = named(SYSTEMS);
  if (browser && system) return `${browser} on ${system}`;
  if (browser) return browser;
  return system ? `A browser on ${system}` : 'A browser or program that does not say what it is';
}
