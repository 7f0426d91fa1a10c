import type { Facts } from '../end/facts.ts';
import type { Arc, Point, Stroke } from './drawing.ts';

/** A cope as it can be drawn: the radius cut down to what fits. All mm; zero where there is none. */
export interface Cut {
  readonly length: number;
  readonly depth: number;
  readonly radius: number;
}

export const topCut = (it: Facts): Cut => cut(it.ct, it.dt, it.rt);
export const bottomCut = (it: Facts): Cut => cut(it.cb, it.db, it.rb);

/**
 * The elevation: outline open at the break, lines of the flanges' inner faces, and of the ends of the root fillets. `right`: where the drawing
 * stops; `before`: levels between which something stands before the beam's end.
 */
export const elevation = (it: Facts, right: number, before: readonly [number, number] | null = null): Stroke[] => [
  ...(before === null ? [outline(it, right)] : outlineBehind(it, right, before)),
  ...levels(it).flatMap(({ y, kind }) => {
    const left = edgeAt(it, y);
    return left < right ? [{ kind, from: { x: left, y }, to: [{ x: right, y }] }] : [];
  }),
];

/** Where the web or flange begins at a level: the beam's end, the cope's face, or a point of its corner. */
const edgeAt = (it: Facts, y: number): number => Math.max(faceAt(topCut(it), y), faceAt(bottomCut(it), it.h - y));

/** True where steel of the beam stands, seen in elevation. */
export const behindWeb = (it: Facts, { x, y }: Point): boolean => y >= 0 && y <= it.h && x >= edgeAt(it, y);

const cut = (length: number, depth: number, radius: number): Cut =>
  length > 0 && depth > 0
    ? { length, depth, radius: Math.max(0, Math.min(radius, length, depth)) }
    : { length: 0, depth: 0, radius: 0 };

/** `y` counted from the flange that is cut. */
const faceAt = ({ length, depth, radius }: Cut, y: number): number => {
  if (y >= depth || y < 0) return 0;
  const below = y - (depth - radius);
  return below <= 0 ? length : length - radius + Math.sqrt(Math.max(0, radius * radius - below * below));
};

const outline = (it: Facts, right: number): Stroke => ({
  kind: 'outline',
  from: { x: right, y: 0 },
  to: [...cornerRun(topCut(it)), ...mirrored(cornerRun(bottomCut(it)), it.h), { x: right, y: it.h }],
});

/** The outline where something hides a part of the end's own edge. */
const outlineBehind = (it: Facts, right: number, before: readonly [number, number]): Stroke[] => {
  const edge = (y: number): Point => ({ x: 0, y: Math.min(Math.max(y, it.dt), it.h - it.db) });
  const [top, foot] = [edge(before[0]), edge(before[1])];
  return [
    { kind: 'outline', from: { x: right, y: 0 }, to: [...cornerRun(topCut(it)), top] },
    { kind: 'hidden', from: top, to: [foot] },
    { kind: 'outline', from: foot, to: [...mirrored(cornerRun(bottomCut(it)), it.h), { x: right, y: it.h }] },
  ];
};

/** From the flange along the cope to the beam's end. */
const cornerRun = ({ length, depth, radius }: Cut): (Point | Arc)[] => {
  if (length === 0) return [{ x: 0, y: 0 }];
  const corner: (Point | Arc)[] =
    radius === 0
      ? [{ x: length, y: depth }]
      : [
          { x: length, y: depth - radius },
          { to: { x: length - radius, y: depth }, radius, clockwise: true },
        ];
  return [{ x: length, y: 0 }, ...corner, { x: 0, y: depth }];
};

/** The same run from the beam's end to the other flange. */
const mirrored = (run: readonly (Point | Arc)[], h: number): (Point | Arc)[] => {
  const at = (p: Point): Point => ({ x: p.x, y: h - p.y });
  const ends = run.map((step) => ('to' in step ? step.to : step));
  return run
    .map((_, i): Point | Arc => {
      const next = run[i + 1];
      const end = at(ends[i]!);
      return next !== undefined && 'to' in next ? { ...next, to: end } : end;
    })
    .reverse();
};

interface Level {
  readonly y: number;
  readonly kind: 'outline' | 'narrow';
}

/** Inner faces of the flanges (of a tapered one: its edge) and the levels where the root fillets meet the web. */
const levels = ({ section, h }: Facts): Level[] => {
  const { family, b, tf, tw, r } = section;
  const slope = section.slope ?? 0;
  const outstand = (b - tw) / (family === 'I' ? 2 : 1);
  const fall = Math.tan(slope);
  const edge = Math.max(0, tf - (outstand / 2) * fall);
  const root = tf + (outstand / 2 - r + r * Math.sin(slope)) * fall + r * Math.cos(slope);
  const fillets: Level[] =
    root > edge
      ? [
          { y: root, kind: 'narrow' },
          { y: h - root, kind: 'narrow' },
        ]
      : [];
  return [{ y: edge, kind: 'outline' }, { y: h - edge, kind: 'outline' }, ...fillets];
};
