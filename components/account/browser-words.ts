const browsers: readonly (readonly [RegExp, string])[] = [
  [/Edg\//u, 'Edge'], [/OPR\//u, 'Opera'], [/Firefox\//u, 'Firefox'], [/Chrome\//u, 'Chrome'], [/Safari\//u, 'Safari'],
];
const systems: readonly (readonly [RegExp, string])[] = [
  [/Android/u, 'Android'], [/iPhone|iPad/u, 'iOS'], [/Windows/u, 'Windows'], [/Mac OS X/u, 'macOS'], [/Linux/u, 'Linux'],
];

/** A user agent in words that let a person recognise their own: 'Firefox on Linux'. */
export function browserWords(userAgent: string): string {
  const browser = browsers.find(([pattern]) => pattern.test(userAgent))?.[1] ?? 'A browser or program';
  const system = systems.find(([pattern]) => pattern.test(userAgent))?.[1];
  return system ? `${browser} on ${system}` : browser;
}
