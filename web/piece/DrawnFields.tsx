import type { LaidText } from '../../core/drawing/laid.ts';
import { capital } from '../../core/words/capital.ts';
import { fieldName } from '../../core/words/words.ts';
import { Field } from '../field/Field.tsx';
import { words } from '../ladder/shown.ts';
import { focused } from '../state/bench.ts';
import { inTradeOrder } from '../state/tradeOrder.ts';
import type { ToScreen } from './pen.ts';

interface Props {
  /** Sizes of the drawing that stand in a field of the end. */
  readonly sizes: readonly (LaidText & { readonly path: string })[];
  readonly place: ToScreen;
}

/** The sizes of the piece as the fields they are, each on its place in its dimension. */
export const DrawnFields = ({ sizes, place }: Props) => (
  <div class="piece-fields" data-walk>
    {inTradeOrder(sizes).map(({ path, box }) => {
      const { x, y } = place({ x: (box.left + box.right) / 2, y: (box.top + box.bottom) / 2 });
      return (
        <span
          key={path}
          class={`piece-field${focused.value === path ? ' in-focus' : ''}`}
          style={{ left: `${x.toFixed(1)}px`, top: `${y.toFixed(1)}px` }}
        >
          <Field path={path} label={capital(fieldName(words.value, path))} variant="drawn" />
        </span>
      );
    })}
  </div>
);
