import { isArc } from './arcs.ts';
import type { Arc, LineKind, Point } from './drawing.ts';
import type { Laid, LaidText, Layer, Mark } from './laid.ts';

/** How a drawing looks as SVG; widths and dashes in px. */
export interface SvgStyle {
  /** px for one mm of the piece. */
  readonly scale: number;
  readonly fontFamily: string;
  readonly ink: string;
  /** Second ink, of derived sizes and lesser words. */
  readonly second: string;
  readonly accent: string;
  readonly paper: string | null;
  /** Width of the narrow line; the wide one is twice that. */
  readonly narrow: number;
}

export const plainStyle: SvgStyle = {
  scale: 1,
  fontFamily: "'IBM Plex Sans Condensed', 'Arial Narrow', sans-serif",
  ink: '#15171a',
  second: '#50545a',
  accent: '#1b49c8',
  paper: '#fcfbf8',
  narrow: 1,
};

/** Dash patterns of ISO 128 in multiples of the narrow width. */
export const dashes: Readonly<Partial<Record<LineKind, readonly number[]>>> = {
  hidden: [9, 3],
  centre: [16, 3, 1, 3],
  neighbour: [18, 3, 1, 3, 1, 3],
  path: [12, 2.5, 2, 2.5],
};

/** Line widths in multiples of the narrow width. */
export const widths: Readonly<Record<LineKind, number>> = {
  outline: 2,
  path: 2.6,
  force: 2.4,
  narrow: 1,
  hidden: 1,
  centre: 1,
  neighbour: 1,
  break: 1,
  hatch: 0.7,
};

/** The drawing as an SVG text of its own size, with the given title. */
export const toSvg = ({ marks, box }: Laid, style: SvgStyle, title = ''): string => {
  const { scale, fontFamily, paper } = style;
  const [wide, high] = [(box.right - box.left) * scale, (box.bottom - box.top) * scale];
  const size = `width="${number(wide)}" height="${number(high)}" viewBox="0 0 ${number(wide)} ${number(high)}"`;
  const at = (p: Point): string => `${number((p.x - box.left) * scale)} ${number((p.y - box.top) * scale)}`;
  const draw = (mark: Mark): string => drawMark(mark, at, style);
  return [
    `<svg xmlns="http://www.w3.org/2000/svg" ${size} font-family="${escaped(fontFamily)}" role="img">`,
    `<title>${escaped(title)}</title>`,
    ...(paper === null ? [] : [`<rect width="100%" height="100%" fill="${paper}"/>`]),
    ...marks.map(draw),
    '</svg>',
  ].join('\n');
};

type At = (point: Point) => string;

const drawMark = (mark: Mark, at: At, style: SvgStyle): string => {
  const ink = inkOf(mark.layer, style);
  if (mark.shape === 'fill') return `<path d="M${mark.outline.map(at).join('L')}Z" fill="${ink}"/>`;
  if (mark.shape === 'text') return drawText(mark, at, style);
  if (mark.shape === 'circle') {
    const [x, y] = at(mark.centre).split(' ');
    const pen = mark.filled ? `fill="${ink}"` : `fill="none" ${strokeOf(mark.kind, ink, style)}`;
    return `<circle cx="${x}" cy="${y}" r="${number(mark.radius * style.scale)}" ${pen}/>`;
  }
  const steps = mark.to.map((step) => drawStep(step, at, style)).join('');
  const pen = strokeOf(mark.kind, ink, style, mark.tick === true ? 2 : undefined);
  return `<path d="M${at(mark.from)}${steps}${mark.closed ? 'Z' : ''}" fill="none" ${pen}/>`;
};

const drawStep = (step: Point | Arc, at: At, { scale }: SvgStyle): string => {
  if (!isArc(step)) return `L${at(step)}`;
  const r = number(step.radius * scale);
  return `A${r} ${r} 0 0 ${step.clockwise ? 1 : 0} ${at(step.to)}`;
};

const drawText = (
  { text, at: point, anchor, rotation, size, role, italic, layer }: LaidText,
  at: At,
  style: SvgStyle,
): string => {
  const [x, y] = at(point).split(' ');
  const faded = role === 'derived' || role === 'second';
  const ink = faded ? style.second : inkOf(layer, style);
  const attributes = [
    `x="${x}" y="${y}" font-size="${number(size * style.scale)}" text-anchor="${anchor}" fill="${ink}"`,
    ...(rotation === 0 ? [] : [`transform="rotate(${rotation} ${x} ${y})"`]),
    ...(italic ? ['font-style="italic"'] : []),
    ...(style.paper === null
      ? []
      : [`stroke="${style.paper}" stroke-width="${number(3 * style.narrow)}" paint-order="stroke"`]),
    ...(role === 'path' ? ['font-weight="600"'] : []),
  ];
  return `<text ${attributes.join(' ')}>${escaped(text)}</text>`;
};

const strokeOf = (kind: LineKind, ink: string, { narrow }: SvgStyle, wide = widths[kind]): string => {
  const dash = dashes[kind];
  const pattern = dash === undefined ? '' : ` stroke-dasharray="${dash.map((it) => number(it * narrow)).join(' ')}"`;
  return `stroke="${ink}" stroke-width="${number(wide * narrow)}"${pattern}`;
};

const inkOf = (layer: Layer, { ink, accent }: SvgStyle): string => (layer === 'path' ? accent : ink);

const number = (value: number): string => String(Math.round(value * 100) / 100);

const escaped = (text: string): string =>
  text.replace(/&/g, '&amp;').replace(/</g, '&lt;').replace(/>/g, '&gt;').replace(/"/g, '&quot;');
