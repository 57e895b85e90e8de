import { readFileSync } from 'node:fs';

const source = readFileSync('apps/client/src/styles/_tokens.scss', 'utf8');

function tokensOf(theme: string): Map<string, string> {
  const block = new RegExp(`@mixin ${theme} \\{([^}]*)\\}`).exec(source)?.[1] ?? '';
  const pairs = [...block.matchAll(/--([\w-]+): (#[0-9a-f]{6});/g)];
  return new Map(pairs.map(([, name = '', colour = '']) => [name, colour]));
}

/** Relative luminance, WCAG 2.2. */
function luminance(colour: string): number {
  const [red = 0, green = 0, blue = 0] = [1, 3, 5]
    .map((at) => parseInt(colour.slice(at, at + 2), 16) / 255)
    .map((part) => (part <= 0.04045 ? part / 12.92 : ((part + 0.055) / 1.055) ** 2.4));
  return 0.2126 * red + 0.7152 * green + 0.0722 * blue;
}

function contrast(one: string, other: string): number {
  const [light = 0, dark = 0] = [luminance(one), luminance(other)].sort((a, b) => b - a);
  return (light + 0.05) / (dark + 0.05);
}

const GROUNDS = ['paper', 'sheet', 'sheet-2'];
const TEXTS = ['ink', 'ink-2', 'steel', 'good', 'warn', 'bad'].flatMap((text) =>
  GROUNDS.map((ground) => [text, ground] as const),
);
const ON_COLOUR = [
  ['on-steel', 'steel'],
  ['ink', 'steel-soft'],
  ['good', 'good-soft'],
  ['warn', 'warn-soft'],
  ['bad', 'bad-soft'],
  ['ink', 'warn-soft'],
  ['ink', 'bad-soft'],
  ['ink', 'good-soft'],
  ['ink-2', 'wall'],
] as const;
const LINES = ['steel', 'warn-line', 'bad-line', 'good'].map((line) => [line, 'sheet'] as const);

describe.each(['light', 'dark'])('the %s theme', (theme) => {
  const tokens = tokensOf(theme);
  const measured = (one: string, other: string) =>
    contrast(tokens.get(one) ?? '#000000', tokens.get(other) ?? '#000000');

  it.each([...TEXTS, ...ON_COLOUR])('shows %s on %s at 4.5 : 1 or more', (text, ground) => {
    expect(measured(text, ground)).toBeGreaterThanOrEqual(4.5);
  });

  it.each(LINES)('draws %s on %s at 3 : 1 or more', (line, ground) => {
    expect(measured(line, ground)).toBeGreaterThanOrEqual(3);
  });
});
