import type { LaidText } from '../../core/drawing/laid.ts';
import type { Lines, ToScreen } from './pen.ts';

/** Lines of the drawing. */
export const DrawnLines = ({ lines }: { lines: readonly Lines[] }) => (
  <>
    {lines.map(({ key, layer, data, width, dash, filled }) => (
      <path
        key={key}
        class={`layer-${layer}${filled ? ' filled' : ''}`}
        d={data}
        stroke-width={filled ? undefined : width}
        stroke-dasharray={dash}
      />
    ))}
  </>
);

interface WordsProps {
  readonly words: readonly LaidText[];
  readonly place: ToScreen;
  readonly scale: number;
  /** Field in focus: its size is drawn in the accent. */
  readonly focus?: string | null;
}

/** Words of the drawing, each at its place. */
export const DrawnWords = ({ words, place, scale, focus = null }: WordsProps) => (
  <>
    {words.map(({ text, at, anchor, size, role, italic, path, layer, rotation }) => {
      const { x, y } = place(at);
      const accent = path !== undefined && path === focus;
      return (
        <text
          class={`word-${role} layer-${layer}${accent ? ' in-focus' : ''}`}
          x={x.toFixed(1)}
          y={y.toFixed(1)}
          font-size={(size * scale).toFixed(1)}
          text-anchor={anchor}
          font-style={italic ? 'italic' : undefined}
          transform={rotation === 0 ? undefined : `rotate(${rotation} ${x} ${y})`}
        >
          {text}
        </text>
      );
    })}
  </>
);
