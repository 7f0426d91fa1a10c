import { isArc } from '../../core/drawing/arcs.ts';
import type { Arc, LineKind, Point } from '../../core/drawing/drawing.ts';
import type { Laid, LaidCircle, LaidFill, LaidRun, LaidText, Layer } from '../../core/drawing/laid.ts';
import { dashes, widths } from '../../core/drawing/toSvg.ts';

/** Lines that are drawn alike, as the data of one SVG path. */
export interface Lines {
  readonly key: string;
  readonly layer: Layer;
  readonly data: string;
  /** px */
  readonly width: number;
  readonly dash: string | undefined;
  /** Filled and not drawn: arrow heads, dots, blackened areas. */
  readonly filled: boolean;
}

/** A drawing ready for the screen, px from the upper left corner of its box. */
export interface Penned {
  readonly lines: readonly Lines[];
  readonly words: readonly LaidText[];
}

/** Width of the pen's tick, as of the outline, and of the narrow line, px. */
const TICK = widths.outline;

/** A place on the drawing, px. */
export type ToScreen = (point: Point) => Point;

export const toScreen =
  ({ box }: Laid, scale: number): ToScreen =>
  ({ x, y }) => ({ x: (x - box.left) * scale, y: (y - box.top) * scale });

const digits = (value: number): string => String(Math.round(value * 100) / 100);

/** Straight lines along the axes are sharp only where they fill whole pixels: odd widths on half ones. */
const snapped = (value: number, width: number): number =>
  Math.round(width) % 2 === 1 ? Math.round(value - 0.5) + 0.5 : Math.round(value);

class Pen {
  private readonly groups = new Map<string, { readonly like: Omit<Lines, 'data'>; data: string }>();

  constructor(
    private readonly place: ToScreen,
    private readonly scale: number,
    private readonly focus: string | null,
  ) {}

  get lines(): Lines[] {
    return [...this.groups.values()].map(({ like, data }) => ({ ...like, data }));
  }

  run(mark: LaidRun): void {
    const { kind, layer, path } = mark;
    const width = mark.tick ? TICK : widths[kind];
    const layerShown: Layer = path !== undefined && path === this.focus ? 'path' : layer;
    const at = this.pointer(mark, width);
    const steps = mark.to.map((step) => this.step(step, at)).join('');
    const data = `M${at(mark.from)}${steps}${mark.closed ? 'Z' : ''}`;
    this.add(layerShown, mark.tick ? 'tick' : kind, data, width, dashes[kind], false);
  }

  circle({ layer, kind, centre, radius, filled }: LaidCircle): void {
    const { x, y } = this.place(centre);
    const r = digits(radius * this.scale);
    const across = digits(2 * radius * this.scale);
    const data = `M${digits(x - radius * this.scale)} ${digits(y)}a${r} ${r} 0 1 0 ${across} 0a${r} ${r} 0 1 0 -${across} 0Z`;
    this.add(layer, filled ? 'fill' : kind, data, widths[kind], filled ? undefined : dashes[kind], filled);
  }

  fill({ layer, outline }: LaidFill): void {
    const at = (point: Point): string => pair(this.place(point));
    this.add(layer, 'fill', `M${outline.map(at).join('L')}Z`, 0, undefined, true);
  }

  private step(step: Point | Arc, at: (point: Point) => string): string {
    if (!isArc(step)) return `L${at(step)}`;
    const r = digits(step.radius * this.scale);
    return `A${r} ${r} 0 0 ${step.clockwise ? 1 : 0} ${at(step.to)}`;
  }

  /** Runs along the axes are put on whole pixels; slanting ones stay where they are. */
  private pointer(mark: LaidRun, width: number): (point: Point) => string {
    let from = mark.from;
    const square = mark.to.every((step) => {
      const to = isArc(step) ? step.to : step;
      const along = isArc(step) || Math.abs(to.x - from.x) < 1e-9 || Math.abs(to.y - from.y) < 1e-9;
      from = to;
      return along;
    });
    if (!square) return (point) => pair(this.place(point));
    return (point) => {
      const { x, y } = this.place(point);
      return pair({ x: snapped(x, width), y: snapped(y, width) });
    };
  }

  private add(
    layer: Layer,
    kind: LineKind | 'tick' | 'fill',
    data: string,
    width: number,
    dash: readonly number[] | undefined,
    filled: boolean,
  ): void {
    const key = `${layer}-${kind}`;
    const group = this.groups.get(key);
    if (group) group.data += data;
    else this.groups.set(key, { like: { key, layer, width, dash: dash?.join(' '), filled }, data });
  }
}

const pair = ({ x, y }: Point): string => `${digits(x)} ${digits(y)}`;

/** The marks of a laid drawing as few SVG paths, and its words. Lines of the field in focus count as those of a chosen path. */
export const penned = (laid: Laid, scale: number, focus: string | null, only?: Layer): Penned => {
  const pen = new Pen(toScreen(laid, scale), scale, focus);
  const words: LaidText[] = [];
  for (const mark of laid.marks) {
    if (only !== undefined && mark.layer !== only) continue;
    if (mark.shape === 'run') pen.run(mark);
    else if (mark.shape === 'circle') pen.circle(mark);
    else if (mark.shape === 'fill') pen.fill(mark);
    else words.push(mark);
  }
  return { lines: pen.lines, words };
};
