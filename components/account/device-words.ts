// Order counts: later browsers also carry the names of earlier ones, and phones those of their parents.
const browsers = [
  ['Edg', 'Edge'],
  ['OPR/', 'Opera'],
  ['Firefox/', 'Firefox'],
  ['Chrome/', 'Chrome'],
  ['Safari/', 'Safari'],
] as const;
const systems = [
  ['Android', 'Android'],
  ['iPhone', 'an iPhone'],
  ['iPad', 'an iPad'],
  ['Windows', 'Windows'],
  ['Mac OS X', 'a Mac'],
  ['CrOS', 'ChromeOS'],
  ['Linux', 'Linux'],
] as const;

/** What a browser says of itself (its User-Agent) in words, `Firefox on Linux`: enough to know one's own devices by. */
export function deviceWords(userAgent: string): string {
  const browser = firstIn(userAgent, browsers);
  const system = firstIn(userAgent, systems);
  if (browser && system) return `${browser} on ${system}`;
  return browser ?? (system ? `A browser on ${system}` : userAgent.trim().slice(0, 60) || 'Unknown device');
}

function firstIn(
  text: string,
  names: readonly (readonly [mark: string, word: string])[],
): string | undefined {
  return names.find(([mark]) => text.includes(mark))?.[1];
}
