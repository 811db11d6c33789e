const browsers: [RegExp, string][] = [
  [/Edg\//, 'Edge'],
  [/Firefox\//, 'Firefox'],
  [/Chrome\//, 'Chrome'],
  [/Safari\//, 'Safari'],
];
const systems: [RegExp, string][] = [
  [/iPhone/, 'an iPhone'],
  [/iPad/, 'an iPad'],
  [/Android/, 'Android'],
  [/Windows/, 'Windows'],
  [/Mac OS X/, 'a Mac'],
  [/Linux/, 'Linux'],
];

/** A user agent in words, "Firefox on Windows"; the first match wins, since most name their forebears too. */
export function deviceWords(userAgent: string): string {
  const find = (list: [RegExp, string][]) => list.find(([pattern]) => pattern.test(userAgent))?.[1];
  const browser = find(browsers);
  const system = find(systems);
  if (!browser && !system) return 'A device we do not know';
  return `${browser ?? 'A browser'} on ${system ?? 'a device we do not know'}`;
}
