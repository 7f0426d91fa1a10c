import { useEffect, useRef } from 'preact/hooks';
import type { Point } from '../../core/drawing/drawing.ts';
import type { LaidText } from '../../core/drawing/laid.ts';
import { Heading } from '../ladder/Heading.tsx';
import { RichText } from '../ladder/RichText.tsx';
import { shown, stale } from '../ladder/shown.ts';
import { focused } from '../state/bench.ts';
import { DrawnLines, DrawnWords } from './Drawn.tsx';
import { DrawnFields } from './DrawnFields.tsx';
import { type Figure, figure, path, sentences, topOf } from './figure.ts';
import { BETWEEN, type LaidView, TITLE } from './fitRoom.ts';
import { measureRoom } from './measureRoom.ts';
import { type Penned, penned, type ToScreen, toScreen } from './pen.ts';

/** The end to scale; where there is room every size on it is the field that holds it. */
export const Piece = () => {
  const frame = useRef<HTMLDivElement>(null);
  useEffect(() => (frame.current ? measureRoom(frame.current) : undefined), []);
  const it = figure.value;
  return (
    <section class={`piece${stale.value ? ' stale' : ''}`} aria-labelledby="piece-heading">
      <Heading id="piece-heading" level={2} title="Piece">
        {it?.fields && <span class="hint">every underlined size is a field</span>}
      </Heading>
      <div class="piece-frame" ref={frame}>
        {it && <Drawn it={it} />}
      </div>
      {it && <InWords />}
    </section>
  );
};

const isField = (word: LaidText): word is LaidText & { readonly path: string } =>
  word.role === 'size' && word.path !== undefined && !isShare(word.path);

/** A reaction given as a share of the web's shear is no field of kN. */
const isShare = (name: string): boolean => name === 'reaction' && typeof shown.value?.end.reaction !== 'number';

/** The views, each with its title where there are several. */
const Drawn = ({ it }: { it: Figure }) => {
  const { views, standing, scale, shrink } = it;
  if (views.length === 1) return <DrawnView it={it} of={views[0]!} />;
  const top = standing === 'beside' ? topOf(it) : null;
  return (
    <div class={`piece-views ${standing}`} style={{ gap: `${BETWEEN}px` }}>
      {views.map((one) => (
        <div key={one.view.name}>
          <p class="piece-title" style={{ height: `${TITLE}px` }}>
            {one.view.title.map(({ text }) => text)}
          </p>
          <div style={{ paddingTop: top === null ? 0 : `${px((one.laid.box.top - top) * scale * shrink)}px` }}>
            <DrawnView it={it} of={one} />
          </div>
        </div>
      ))}
    </div>
  );
};

/** How each view is called for those who cannot see it. */
const names = {
  side: 'The beam end, drawn to scale',
  support: 'What lies on the support, drawn to scale',
} as const;

const DrawnView = ({ it, of }: { it: Figure; of: LaidView }) => {
  const { scale, shrink, fields } = it;
  const { view, laid } = of;
  const place = toScreen(laid, scale);
  const { lines, words } = penned(laid, scale, focused.value);
  const [width, height] = [(laid.box.right - laid.box.left) * scale, (laid.box.bottom - laid.box.top) * scale];
  const over = pathOver(of, scale);
  const sizes = fields ? words.filter(isField) : [];
  return (
    <div class="piece-sheet" style={{ width: `${px(width * shrink)}px`, height: `${px(height * shrink)}px` }}>
      <svg
        class="drawing"
        viewBox={`0 0 ${px(width)} ${px(height)}`}
        width={px(width * shrink)}
        height={px(height * shrink)}
        role="img"
        aria-label={names[view.name]}
        aria-describedby="piece-sentences"
      >
        <DrawnLines lines={lines} />
        {over && <DrawnLines lines={over.lines} />}
        {over && <path class="ground" d={groundOf(sizes, place)} />}
        <DrawnWords
          words={fields ? words.filter((word) => !isField(word)) : words}
          place={place}
          scale={scale}
          focus={focused.value}
        />
        {over && <DrawnWords words={over.words} place={place} scale={scale} />}
      </svg>
      {fields && <DrawnFields sizes={sizes} place={(point) => scaled(place(point), shrink)} />}
    </div>
  );
};

const px = (value: number): string => value.toFixed(1);

const scaled = ({ x, y }: Point, by: number): Point => ({ x: x * by, y: y * by });

/** Paper under the fields, so that the hatch of a path does not strike through them. */
const groundOf = (sizes: readonly LaidText[], place: ToScreen): string =>
  sizes
    .map(({ box }) => {
      const [from, to] = [place({ x: box.left, y: box.top }), place({ x: box.right, y: box.bottom })];
      return `M${px(from.x)} ${px(from.y)}H${px(to.x)}V${px(to.y)}H${px(from.x)}Z`;
    })
    .join('');

/** The path of the chosen rung; the box of the drawing without it governs, so that nothing moves when a rung is touched. */
const pathOver = ({ laid, over }: LaidView, scale: number): Penned | null =>
  over && penned({ ...over, box: laid.box }, scale, null, 'path');

/** What the drawing shows, said in sentences. */
const InWords = () => (
  <>
    {path.value && (
      <p class="piece-caption">
        <RichText text={path.value.caption} />
      </p>
    )}
    <details class="piece-words">
      <summary>The piece in words</summary>
      <ul id="piece-sentences">
        {sentences.value.map((text) => (
          <li>{text}</li>
        ))}
      </ul>
    </details>
  </>
);
