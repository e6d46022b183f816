import { readFileSync } from 'node:fs';
import { describe, expect, it } from 'vitest';

const css = readFileSync('app/globals.css', 'utf8');

type Linear = [number, number, number];

function tokensOf(selector: string): Record<string, string> {
  const block = css.slice(css.indexOf(`${selector} {`)).split('}')[0] ?? '';
  return Object.fromEntries(
    [...block.matchAll(/--([a-z0-9-]+):\s*(#[0-9a-f]{6})/gi)].map((m) => [m[1] ?? '', m[2] ?? '']),
  );
}

function linear(hex: string): Linear {
  return [1, 3, 5].map((at) => {
    const channel = Number.parseInt(hex.slice(at, at + 2), 16) / 255;
    return channel <= 0.04045 ? channel / 12.92 : ((channel + 0.055) / 1.055) ** 2.4;
  }) as Linear;
}

// Relative luminance and contrast ratio as defined in WCAG 2.2.
function contrast(a: string, b: string): number {
  const [high, low] = [a, b]
    .map((hex) => linear(hex))
    .map(([r, g, bl]) => 0.2126 * r + 0.7152 * g + 0.0722 * bl)
    .sort((x, y) => y - x) as [number, number];
  return (high + 0.05) / (low + 0.05);
}

// Björn Ottosson's OKLab, from linear sRGB (2020); from memory.
function okLab([r, g, b]: Linear): Linear {
  const l = Math.cbrt(0.4122214708 * r + 0.5363325363 * g + 0.0514459929 * b);
  const m = Math.cbrt(0.2119034982 * r + 0.6806995451 * g + 0.1073969566 * b);
  const s = Math.cbrt(0.0883024619 * r + 0.2817188376 * g + 0.6299787005 * b);
  return [
    0.2104542553 * l + 0.793617785 * m - 0.0040720468 * s,
    1.9779984951 * l - 2.428592205 * m + 0.4505937099 * s,
    0.0259040371 * l + 0.7827717662 * m - 0.808675766 * s,
  ];
}

// Machado, Oliveira and Fernandes 2009, full severity, applied in linear sRGB; from memory.
const visions: Record<string, Linear[]> = {
  'full color vision': [
    [1, 0, 0],
    [0, 1, 0],
    [0, 0, 1],
  ],
  protanopia: [
    [0.152286, 1.052583, -0.204868],
    [0.114503, 0.786281, 0.099216],
    [-0.003882, -0.048116, 1.051998],
  ],
  deuteranopia: [
    [0.367322, 0.860646, -0.227968],
    [0.280085, 0.672501, 0.047413],
    [-0.01182, 0.04294, 0.968881],
  ],
  tritanopia: [
    [1.255528, -0.076749, -0.178779],
    [-0.078411, 0.930809, 0.147602],
    [0.004733, 0.691367, 0.3039],
  ],
};

function seen(matrix: Linear[], hex: string): Linear {
  const from = linear(hex);
  return matrix.map((row) =>
    Math.min(1, Math.max(0, row[0] * from[0] + row[1] * from[1] + row[2] * from[2])),
  ) as Linear;
}

function smallestDistance(colors: string[], matrix: Linear[]): number {
  const points = colors.map((hex) => okLab(seen(matrix, hex)));
  return Math.min(
    ...points.flatMap((a, i) =>
      points.slice(i + 1).map((b) => Math.hypot(a[0] - b[0], a[1] - b[1], a[2] - b[2])),
    ),
  );
}

const series = [1, 2, 3, 4, 5, 6].map((n) => `series-${n}`);

describe.each([
  ['light', ':root', 4.5],
  ['dark', ":root[data-theme='dark']", 6.5],
])('the %s theme', (_name, selector, seriesContrastLeast) => {
  const token = tokensOf(selector);
  const of = (name: string) => token[name] ?? '';

  it('defines every token as a color of six digits', () => {
    for (const name of [
      'paper',
      'ink',
      'ink-soft',
      'rule',
      'bone',
      'tape-red',
      'flag',
      'flag-text',
      ...series,
    ])
      expect(of(name), name).toMatch(/^#[0-9a-f]{6}$/i);
  });

  it('keeps field text, ink and flag-text, at 7 to 1 or more', () => {
    expect(contrast(of('ink'), of('paper'))).toBeGreaterThanOrEqual(7);
    expect(contrast(of('ink'), of('bone'))).toBeGreaterThanOrEqual(7);
    expect(contrast(of('flag-text'), of('paper'))).toBeGreaterThanOrEqual(7);
  });

  it('keeps every text of the desk at 4.5 to 1 or more, on paper and on bone', () => {
    for (const name of ['ink-soft', 'flag-text', 'tape-red', ...series])
      for (const ground of ['paper', 'bone'])
        expect(contrast(of(name), of(ground)), `${name} on ${ground}`).toBeGreaterThanOrEqual(4.5);
  });

  it('keeps the flag, a shape or a large figure, at 3 to 1 or more', () => {
    expect(contrast(of('flag'), of('paper'))).toBeGreaterThanOrEqual(3);
    expect(contrast(of('flag'), of('bone'))).toBeGreaterThanOrEqual(3);
  });

  it('keeps series lines and their labels legible on paper', () => {
    for (const name of series)
      expect(contrast(of(name), of('paper')), name).toBeGreaterThanOrEqual(seriesContrastLeast);
  });

  it.each(Object.entries(visions))('keeps the series apart under %s', (_vision, matrix) => {
    // A distance of 0.02 is about the least that is seen side by side; thin lines apart from each other need more.
    expect(smallestDistance(series.map(of), matrix)).toBeGreaterThanOrEqual(0.08);
  });
});

it('asks 7 to 1 of every dark text but the series', () => {
  const token = tokensOf(":root[data-theme='dark']");
  for (const name of ['ink', 'ink-soft', 'flag-text'])
    expect(contrast(token[name] ?? '', token['paper'] ?? ''), name).toBeGreaterThanOrEqual(7);
});
