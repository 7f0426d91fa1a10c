import type { ComponentChildren } from 'preact';
import { goTo } from './goTo.ts';

interface FieldLinkProps {
  readonly path: string;
  readonly kind: 'value' | 'plain';
  readonly class?: string;
  /** Left out of the order of the Tab key, because the field itself is on the page. */
  readonly skipped?: boolean;
  readonly children: ComponentChildren;
}

/** Words that lead to a field: its line opens and the field gets focus. */
export const FieldLink = ({ path, kind, class: more = '', skipped = false, children }: FieldLinkProps) => (
  <a
    class={`${kind} ${more}`.trim()}
    href={`#box-${path}`}
    tabIndex={skipped ? -1 : 0}
    onClick={(event: Event) => {
      event.preventDefault();
      goTo(path);
    }}
  >
    {children}
  </a>
);
