import { memo, useId } from 'react';
import { type Lobe, layRibbon, type RibbonItem, type RibbonSize, ribbonWords } from './ribbon-geometry.ts';
import { strandColours } from './strand-label.tsx';

/** Thinnest strand, as drawn, that still carries its label. */
const LABEL_MIN_PX = 17;

interface RibbonProps {
  items: RibbonItem[];
  size: RibbonSize;
  /** What it shows, for the spoken text: "Mixed set". Decorative without it. */
  name?: string;
  /** What it lies on. */
  surface?: 'ground' | 'sheet';
  hasMarks?: boolean;
  /** Strength of a strand not asked yet, in per cent. */
  tint?: number;
  /** Width of the place it stands in, in pixels; a longer plait is scaled down and may lose its labels. */
  room?: number;
  hasLabels?: boolean;
}

interface Stroke {
  stroke: string;
  width: number;
  /** Drawn along the strand, once. */
  isFilling?: boolean;
}

/** Strength of the strand on the page before it is answered, in per cent. */
const NOW_TINT = 46;

function nowStrokes({ item }: Lobe, width: number, surface: string): Stroke[] {
  const { s, e } = strandColours(item.strand);
  const open = { stroke: `color-mix(in oklab, ${s} ${NOW_TINT}%, ${surface})`, width: width - 2.8 };
  const full = { stroke: s, width: width - 2.9, isFilling: item.isFresh === true };
  return [
    { stroke: surface, width: width + 7.4 },
    { stroke: 'var(--ink)', width: width + 5.4 },
    { stroke: surface, width: width + 1.4 },
    { stroke: e, width: width - 1 },
    open,
    ...(item.isAnswered ? [full] : []),
  ];
}

function strokesOf(lobe: Lobe, size: RibbonSize, surface: string, tint: number): Stroke[] {
  const { s, e } = strandColours(lobe.item.strand);
  const { width, gap } = size;
  if (lobe.item.state === 'now') return nowStrokes(lobe, width, surface);
  const isDone = lobe.item.state === 'done';
  return [
    { stroke: surface, width: width + 2 * gap },
    { stroke: isDone ? e : `color-mix(in oklab, ${e} 74%, ${surface})`, width },
    { stroke: isDone ? s : `color-mix(in oklab, ${s} ${tint}%, ${surface})`, width: width - 2.2 },
  ];
}

function Strand({
  lobe,
  size,
  surface,
  tint,
  mask,
}: {
  lobe: Lobe;
  size: RibbonSize;
  surface: string;
  tint: number;
  mask: string | undefined;
}) {
  return (
    <g mask={mask}>
      {strokesOf(lobe, size, surface, tint).map(({ stroke, width, isFilling }) => (
        <g key={width} style={{ stroke }} strokeWidth={width} className={isFilling ? 'strand-fill' : undefined}>
          <path d={lobe.body} strokeLinecap="butt" pathLength={isFilling ? 1 : undefined} />
          {lobe.caps.map((cap) => (
            <path key={cap.slice(0, 16)} d={cap} pathLength={isFilling ? 1 : undefined} />
          ))}
        </g>
      ))}
    </g>
  );
}

function LobeText({ lobe, hasLabel, fontSize }: { lobe: Lobe; hasLabel: boolean; fontSize: number }) {
  const { e, l } = strandColours(lobe.item.strand);
  const { item, isUp, labelAt, peak } = lobe;
  const isSolid = item.state === 'done' || (item.state === 'now' && item.isAnswered);
  return (
    <>
      {hasLabel ? (
        <text
          x={labelAt.x}
          y={labelAt.y + fontSize * 0.36}
          textAnchor="middle"
          fontSize={fontSize}
          fontWeight="750"
          letterSpacing=".3"
          style={{ fill: isSolid ? l : item.state === 'now' ? 'var(--ink)' : e }}
        >
          {item.code}
        </text>
      ) : null}
      {item.state === 'now' ? (
        <path
          d={isUp ? `M${peak.x - 4.5} ${peak.y - 8.2}h9l-4.5 4.6z` : `M${peak.x - 4.5} ${peak.y + 8.2}h9l-4.5 -4.6z`}
          style={{ fill: 'var(--ink)' }}
        />
      ) : null}
      {item.marks ? (
        <text
          x={peak.x}
          y={isUp ? peak.y - 7 : peak.y + 16}
          textAnchor="middle"
          fontSize="12.5"
          fontWeight={item.isLow ? 750 : 560}
          className="num"
          style={{ fill: item.isLow ? 'var(--gap)' : 'var(--ink-2)' }}
        >
          {item.marks}
        </text>
      ) : null}
    </>
  );
}

/** The strand ribbon: a plait that carries a set's order, progress and marks. */
export const Ribbon = memo(function Ribbon(props: RibbonProps) {
  const { items, size, name, surface = 'ground', hasMarks = false, tint = 22, room, hasLabels = true } = props;
  const id = useId();
  if (items.length === 0) return null;
  const { width, height, lobes } = layRibbon(items, size, hasMarks);
  const paper = `var(--${surface})`;
  const scale = room && width > room ? room / width : 1;
  const hasLabel = hasLabels && size.width * scale >= LABEL_MIN_PX;
  return (
    <svg
      viewBox={`0 0 ${width} ${height}`}
      width={width}
      height={height}
      className="w-full"
      style={{ maxWidth: width * 1.1, height: 'auto', fontFamily: 'var(--font-text)' }}
      fill="none"
      strokeLinecap="round"
      role="img"
      aria-label={name ? ribbonWords(name, items) : undefined}
      aria-hidden={name ? undefined : true}
    >
      <defs>
        {lobes.map((lobe, index) =>
          lobe.under ? (
            <mask
              // Lobes never change places.
              key={lobe.under.slice(0, 16)}
              id={`${id}-${index}`}
              maskUnits="userSpaceOnUse"
              x="0"
              y="0"
              width={width}
              height={height}
            >
              <path d={`M0 0H${width}V${height}H0z`} fill="#fff" stroke="none" />
              <path d={lobe.under} stroke="#000" strokeLinecap="butt" strokeWidth={size.width + 2 * size.gap} />
            </mask>
          ) : null,
        )}
      </defs>
      {lobes.map((lobe, index) => (
        <Strand
          key={lobe.body.slice(0, 16)}
          lobe={lobe}
          size={size}
          surface={paper}
          tint={tint}
          mask={lobe.under ? `url(#${id}-${index})` : undefined}
        />
      ))}
      <g stroke="none">
        {lobes.map((lobe) => (
          <LobeText
            key={lobe.body.slice(0, 16)}
            lobe={lobe}
            hasLabel={hasLabel}
            fontSize={size.width >= 24 ? 12 : 11}
          />
        ))}
      </g>
    </svg>
  );
});
