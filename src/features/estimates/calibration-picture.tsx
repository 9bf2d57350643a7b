import { countWords, type SeenBand } from './estimate-words.ts';

interface CalibrationPictureProps {
  bands: readonly SeenBand[];
  /** Points under the diagonal from which estimates promise too much; below 0. */
  thresholdPoints: number;
}

const SIZE = 256;
const LEFT = 54;
const TOP = 16;
/** Room at the right for the count of the last dot. */
const WIDTH = LEFT + SIZE + 40;
const HEIGHT = TOP + SIZE + 46;
const TICKS = [0, 20, 40, 60, 80, 100];
const [SMALLEST_DOT, LARGEST_DOT] = [4, 13];

const x = (percent: number): number => LEFT + (SIZE * percent) / 100;
const y = (percent: number): number => TOP + (SIZE * (100 - percent)) / 100;
/** A dot's area follows its attempts. */
const radius = (attempts: number, most: number): number =>
  Math.max(SMALLEST_DOT, LARGEST_DOT * Math.sqrt(attempts / most));

function Axes() {
  return (
    <>
      {TICKS.map((tick) => (
        <g key={tick}>
          <path d={`M${LEFT} ${y(tick)}H${LEFT + SIZE}`} stroke={tick === 0 ? 'var(--edge)' : 'var(--rule)'} />
          <text x={LEFT - 8} y={y(tick) + 4} textAnchor="end">
            {tick}%
          </text>
          <text x={x(tick)} y={TOP + SIZE + 18} textAnchor="middle">
            {tick}%
          </text>
        </g>
      ))}
      <text x={x(50)} y={TOP + SIZE + 40} textAnchor="middle" className="font-bold" fill="var(--ink)">
        Expected recall
      </text>
      <text
        transform={`translate(12 ${y(50)}) rotate(-90)`}
        textAnchor="middle"
        className="font-bold"
        fill="var(--ink)"
      >
        Recalled
      </text>
    </>
  );
}

/** The count stands above or below the dot, away from the diagonal: beside it, near neighbours would run together. */
function Dot({ band, most, isFar }: { band: SeenBand; most: number; isFar: boolean }) {
  const [cx, cy, r] = [x(band.expected), y(band.observed), radius(band.attempts, most)];
  const isAbove = band.difference > 0;
  const colour = isFar ? 'var(--gap)' : 'var(--ink)';
  return (
    <g fill={colour}>
      <circle cx={cx} cy={cy} r={r} />
      <text
        x={cx}
        y={isAbove ? cy - r - 4 : cy + r + 12}
        textAnchor="middle"
        stroke="var(--ground)"
        strokeWidth="3"
        paintOrder="stroke"
        className="num"
      >
        {countWords(band.attempts)}
      </text>
    </g>
  );
}

/** Expected against observed recall: on the diagonal the model is right, under it too hopeful. */
export function CalibrationPicture({ bands, thresholdPoints }: CalibrationPictureProps) {
  const most = Math.max(1, ...bands.map(({ attempts }) => attempts));
  const limit = -thresholdPoints;
  return (
    <svg
      viewBox={`0 0 ${WIDTH} ${HEIGHT}`}
      role="img"
      aria-label={`Observed recall against expected recall, in ${bands.length === 1 ? '1 band' : `${bands.length} bands`}. On the diagonal recall is as expected; dots under it were too hopeful. The table has the same figures.`}
      className="block h-auto w-full max-w-[27rem]"
      fontSize="12"
      fill="var(--ink-2)"
    >
      <path d={`M${x(limit)} ${y(0)}L${x(100)} ${y(100 - limit)}V${y(0)}Z`} fill="var(--gap-wash)" />
      {/* Printed paper has no fills. */}
      <path d={`M${x(limit)} ${y(0)}L${x(100)} ${y(100 - limit)}`} stroke="var(--gap)" strokeDasharray="1 3" />
      <Axes />
      <path d={`M${x(0)} ${y(0)}L${x(100)} ${y(100)}`} stroke="var(--ink-2)" strokeWidth="1.5" strokeDasharray="4 3" />
      <text x={x(98)} y={y(4)} textAnchor="end" fill="var(--gap)">
        over {limit} points too hopeful
      </text>
      <text x={x(4)} y={y(92)} fill="var(--ink-2)">
        better than expected
      </text>
      {bands.map((band) => (
        <Dot key={band.from} band={band} most={most} isFar={band.difference < thresholdPoints} />
      ))}
    </svg>
  );
}
