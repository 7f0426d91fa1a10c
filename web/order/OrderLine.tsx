import type { ComponentChildren } from 'preact';
import { useEffect, useLayoutEffect, useRef } from 'preact/hooks';
import { enter, WALK_END, type WalkEnd } from '../field/walk.ts';
import { faults } from '../state/bench.ts';
import { faultAt } from '../state/fieldText.ts';
import { type LineName, lineOf } from '../state/tradeOrder.ts';
import { laterPart } from '../style/laterPart.ts';
import { goOn, openLine, takeWanted, wants } from './goTo.ts';

interface OrderLineProps {
  readonly name: LineName;
  readonly title: string;
  /** The line in one sentence. */
  readonly sentence: ComponentChildren;
  /** Names of fields stand over them, where they are long. */
  readonly stacked?: boolean;
}

const fields = laterPart(async () => (await import('./lineFields.ts')).lineFields);

const focusWanted = (line: HTMLElement): void => {
  const wanted = takeWanted();
  if (!wanted) return;
  if ('back' in wanted) enter(line, wanted.back);
  else {
    const field = line.querySelector<HTMLElement>(`[data-field="${CSS.escape(wanted.path)}"]`);
    if (field) field.focus();
    else enter(line);
  }
};

/** Faults of a closed line, so that none hides behind it. */
const ClosedFaults = ({ name }: { readonly name: LineName }) => (
  <>
    {faults.value
      .filter(({ path }) => lineOf(path) === name && faultAt(path) !== '')
      .map(({ path, text }) => (
        <p key={path} class="field-fault">
          {text}
        </p>
      ))}
  </>
);

/** One line of the order: a sentence that opens in place to its fields, which are no part of the first view. Enter in its last field opens the next line. */
export const OrderLine = ({ name, title, sentence, stacked = false }: OrderLineProps) => {
  const line = useRef<HTMLFieldSetElement>(null);
  const open = openLine.value === name;
  const Fields = open ? fields.value?.[name] : undefined;
  const wanted = wants.value;
  useLayoutEffect(() => {
    if (Fields && line.current) focusWanted(line.current);
  }, [Fields, wanted]);
  useEffect(() => {
    const fields = line.current;
    const onEnd = (event: Event) => goOn(name, (event as CustomEvent<WalkEnd>).detail.back);
    fields?.addEventListener(WALK_END, onEnd);
    return () => fields?.removeEventListener(WALK_END, onEnd);
  }, [name]);
  const close = (event: KeyboardEvent) => {
    if (event.key !== 'Escape' || !open) return;
    openLine.value = null;
    line.current?.querySelector<HTMLElement>('.line-title')?.focus();
  };
  return (
    <li class={`order-line${open ? ' open' : ''}`}>
      <fieldset ref={line} data-walk onKeyDown={close}>
        <legend>
          <button
            type="button"
            class="line-title"
            aria-expanded={open}
            onClick={() => {
              openLine.value = open ? null : name;
            }}
          >
            {title}
          </button>
        </legend>
        <p class="sentence">{sentence}</p>
        {Fields && (
          <div class={`order-fields${stacked ? ' stacked' : ''}`}>
            <Fields />
          </div>
        )}
        {!open && <ClosedFaults name={name} />}
      </fieldset>
    </li>
  );
};
