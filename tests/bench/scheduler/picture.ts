import { MAIN_ROW } from './acceptance.ts';
import { estimate } from './estimate.ts';
import type { LearnerType } from './learner.ts';
import type { Options } from './options.ts';
import type { Results } from './results.ts';

/** The product's colours on paper; the picture brings its own ground, so that it reads on any page. */
const COLOURS = {
  sheet: '#fffdf9',
  ink: '#1a2230',
  quiet: '#5f636e',
  rule: '#d9d0be',
  other: '#9b9481',
  ours: '#0b6a50',
} as const;

const ROWS: readonly (readonly [id: string, label: string])[] = [
  ['none', 'No practice'],
  ['random', 'Random questions'],
  ['blocked', 'Topic by topic, then cramming'],
  ['ladder', 'Fixed gaps, 1 to 30 days'],
  ['due', 'Due order'],
  ['tg', 'Plait'],
  ['bound', 'Most that could be reached'],
];
const HEADINGS: Record<LearnerType, readonly [string, string]> = {
  a: ['Forgets slower and slower', 'FSRS-6, own weights'],
  b: ['Gains by spacing', 'activation model'],
  c: ['Forgets steadily', 'half-lives'],
};

const LEFT = 226;
const PANEL = 190;
const GAP = 52;
const TOP = 112;
const ROW = 30;
const BAR = 16;
const TICKS = [0, 25, 50, 75, 100];

interface Style {
  size?: number;
  anchor?: 'start' | 'middle' | 'end';
  weight?: number;
  fill?: string;
}

const text = (
  x: number,
  y: number,
  words: string,
  { size = 13, anchor = 'start', weight = 400, fill }: Style,
): string =>
  `<text x="${x}" y="${y}" font-size="${size}" font-weight="${weight}" text-anchor="${anchor}" fill="${fill ?? COLOURS.ink}">${words}</text>`;

const vertical = (x: number, from: number, to: number, colour: string): string =>
  `<path d="M${x} ${from}V${to}" stroke="${colour}"/>`;

/** The README's picture: exam-day recall of the product and of what people would do instead, as an SVG file. */
export function picture(results: Results, { types, learners, settings }: Options): string {
  const rows = ROWS.filter(([id]) => types.some((type) => results.shares(MAIN_ROW, type, id)));
  const bottom = TOP + rows.length * ROW;
  const width = LEFT + types.length * (PANEL + GAP) + 8;
  const height = bottom + 62;
  const about =
    `Simulated: ${learners} learners of each kind, ${settings.weeks} weeks × ${settings.setsADay * 25} minutes a day. ` +
    'Mean expected recall by marks; lines show two standard errors each way.';
  return [
    `<svg xmlns="http://www.w3.org/2000/svg" viewBox="0 0 ${width} ${height}" width="${width}" height="${height}" role="img" aria-labelledby="title about" font-family="'Atkinson Hyperlegible Next', system-ui, -apple-system, 'Segoe UI', sans-serif">`,
    '<title id="title">Recall on the days of the papers, by how questions are chosen</title>',
    `<desc id="about">${about} ${spoken(results, types)}</desc>`,
    `<rect x="0.5" y="0.5" width="${width - 1}" height="${height - 1}" rx="10" fill="${COLOURS.sheet}" stroke="${COLOURS.rule}"/>`,
    text(22, 38, 'Recall on the days of the papers, %', { size: 19, weight: 700 }),
    ...rows.map(([id, label], row) =>
      text(LEFT - 12, TOP + row * ROW + 20, label, { anchor: 'end', weight: id === 'tg' ? 700 : 400 }),
    ),
    ...types.map((type, place) => panel(results, type, LEFT + place * (PANEL + GAP), rows, bottom)),
    text(22, height - 18, about, { size: 12, fill: COLOURS.quiet }),
    '</svg>',
    '',
  ].join('\n');
}

function panel(results: Results, type: LearnerType, x: number, rows: typeof ROWS, bottom: number): string {
  const [heading, below] = HEADINGS[type];
  const at = (points: number): number => x + (points / 100) * PANEL;
  return [
    text(x, 74, heading, { weight: 700 }),
    text(x, 92, below, { size: 12, fill: COLOURS.quiet }),
    ...TICKS.flatMap((tick) => [
      vertical(at(tick), TOP, bottom, COLOURS.rule),
      text(at(tick), bottom + 17, String(tick), { size: 11, anchor: 'middle', fill: COLOURS.quiet }),
    ]),
    ...rows.map(([id], row) => bar(id, results.shares(MAIN_ROW, type, id), at, TOP + row * ROW + 7)),
  ].join('\n');
}

function bar(id: string, shares: readonly number[] | undefined, at: (points: number) => number, y: number): string {
  if (shares === undefined) return '';
  const { mean, error } = estimate(shares);
  const [from, to] = [Math.max(0, mean - 2 * error), Math.min(100, mean + 2 * error)].map(at);
  const middle = y + BAR / 2;
  const look =
    id === 'bound'
      ? `fill="none" stroke="${COLOURS.quiet}" stroke-dasharray="3 2"`
      : `fill="${id === 'tg' ? COLOURS.ours : COLOURS.other}"`;
  return [
    `<rect x="${at(0)}" y="${y}" width="${(at(mean) - at(0)).toFixed(1)}" height="${BAR}" rx="2" ${look}/>`,
    `<path d="M${from?.toFixed(1)} ${middle}H${to?.toFixed(1)}" stroke="${COLOURS.ink}" stroke-width="1.5"/>`,
    text(at(100) + 8, middle + 5, mean.toFixed(1), { weight: id === 'tg' ? 700 : 400 }),
  ].join('\n');
}

/** The figures in words, for those who do not see the bars. */
const spoken = (results: Results, types: readonly LearnerType[]): string =>
  types
    .map((type) => {
      const figures = ROWS.flatMap(([id, label]) => {
        const shares = results.shares(MAIN_ROW, type, id);
        return shares ? [`${label} ${estimate(shares).mean.toFixed(1)}`] : [];
      });
      return `${HEADINGS[type][0]}: ${figures.join(', ')}.`;
    })
    .join(' ');
