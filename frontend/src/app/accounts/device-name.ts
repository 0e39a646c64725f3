const systems: readonly (readonly [RegExp, string])[] = [
  [/iPhone/, 'iPhone'],
  [/iPad/, 'iPad'],
  [/Android/, 'Android'],
  [/Windows/, 'Windows'],
  [/Mac OS X|Macintosh/, 'Mac'],
  [/Linux|X11/, 'Linux'],
];

/** Edge and Chrome call themselves Safari too, so the order matters. */
const browsers: readonly (readonly [RegExp, string])[] = [
  [/Edg\//, 'Edge'],
  [/Firefox\//, 'Firefox'],
  [/(Chrome|Chromium|CriOS)\//, 'Chrome'],
  [/Safari\//, 'Safari'],
];

const nameIn = (agent: string, names: typeof systems): string | undefined =>
  names.find(([sign]) => sign.test(agent))?.[1];

/** What a browser's own description amounts to for a person: “Firefox, Windows”. */
export function deviceName(agent: string): string {
  const parts = [nameIn(agent, browsers), nameIn(agent, systems)].filter(Boolean);
  return parts.length > 0 ? parts.join(', ') : $localize`An unknown device`;
}
