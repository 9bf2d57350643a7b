/** `next` not asked yet, `now` on the page, `done` answered. */
type LobeState = 'next' | 'now' | 'done';

export interface RibbonItem {
  /** The two letters on the strand. */
  code: string;
  name: string;
  strand: string;
  state: LobeState;
  /** The question on the page is answered: its strand is solid. */
  isAnswered?: boolean;
  /** Answered just now: the strand fills along its length, once. */
  isFresh?: boolean;
  /** "2/3", once the set is finished. */
  marks?: string;
  /** Under half the marks. */
  isLow?: boolean;
}

/** Pixels before scaling: distance between lobes, their rise, the strand's thickness, paper between strands. */
export interface RibbonSize {
  step: number;
  rise: number;
  width: number;
  gap: number;
}

export const ribbonSizes = {
  today: { step: 41, rise: 25, width: 25, gap: 2.6 },
  todayPhone: { step: 21, rise: 12.5, width: 13, gap: 1.6 },
  runner: { step: 29, rise: 17, width: 18, gap: 2.2 },
  runnerPhone: { step: 16, rise: 9.5, width: 10, gap: 1.5 },
  signIn: { step: 72, rise: 60, width: 66, gap: 4 },
  signInPhone: { step: 40, rise: 20, width: 24, gap: 2.6 },
} as const satisfies Record<string, RibbonSize>;

export interface Lobe {
  item: RibbonItem;
  /** Odd lobes hang below the middle. */
  isUp: boolean;
  /** Path with butt caps. */
  body: string;
  /** Further round-capped paths for the loose ends: the first lobe and the last two. */
  caps: string[];
  /** The start of the lobe before, which this one tucks under. */
  under: string | null;
  labelAt: { x: number; y: number };
  /** Outer edge: the pointer of "now", the marks when finished. */
  peak: { x: number; y: number };
}

export interface Ribbon {
  width: number;
  height: number;
  lobes: Lobe[];
}

const SAMPLES = 30;

/**
 * A true three-strand plait, one lobe a question. Lobe i is a half sine from x = i·step over 3·step,
 * alternately up and down. Paint the lobes in order, each masked by its `under`.
 */
export function layRibbon(items: RibbonItem[], size: RibbonSize, hasMarks = false): Ribbon {
  const { step, rise, width } = size;
  const pad = width / 2 + 8.5;
  const room = hasMarks ? 14 : 0;
  const mid = pad + room + rise;
  const sign = (index: number) => (index % 2 === 0 ? -1 : 1);

  const arc = (index: number, from: number, to: number): string => {
    let path = '';
    for (let sample = 0; sample <= SAMPLES; sample++) {
      const t = from + ((to - from) * sample) / SAMPLES;
      const x = pad + index * step + 3 * step * t;
      const y = mid + sign(index) * rise * Math.sin(Math.PI * t);
      path += `${sample ? 'L' : 'M'}${x.toFixed(1)} ${y.toFixed(1)}`;
    }
    return path;
  };

  const lobes = items.map((item, index): Lobe => {
    const isLoose = index >= items.length - 2;
    const caps: string[] = [];
    if (index === 0) caps.push(arc(0, 0, 0.4));
    if (isLoose) caps.push(arc(index, 0.3, 0.84));
    const x = pad + index * step;
    return {
      item,
      isUp: sign(index) < 0,
      body: arc(index, index ? -0.16 : 0, isLoose ? 0.84 : 0.85),
      caps,
      under: index ? arc(index - 1, 0, 0.5) : null,
      labelAt: { x: x + 1.26 * step, y: mid + sign(index) * rise * Math.sin(Math.PI * 0.42) },
      peak: { x: x + 1.5 * step, y: mid + sign(index) * (rise + width / 2) },
    };
  });

  return {
    width: Math.round((items.length - 1) * step + 3 * step * 0.87 + 2 * pad),
    height: Math.round(mid + rise + pad + room),
    lobes,
  };
}

/** The order in words, for those who cannot see the strands. */
export function ribbonWords(name: string, items: RibbonItem[]): string {
  const done = items.filter((item) => item.state === 'done' || item.isAnswered).length;
  const order = items.map((item) => (item.marks ? `${item.name} ${item.marks}` : item.name)).join(', ');
  return `${name}: ${items.length} ${items.length === 1 ? 'question' : 'questions'}, ${done} answered. Order: ${order}.`;
}
