import { useLayoutEffect, useRef } from 'preact/hooks';
import { demanded, faults } from '../state/bench.ts';
import { lineOf } from '../state/tradeOrder.ts';
import { FieldLink } from './FieldLink.tsx';

/** Every fault of the end, in the words that stand beside its field too, once they were asked for; it takes focus then. */
export const FaultList = () => {
  const list = useRef<HTMLElement>(null);
  const asked = demanded.value;
  useLayoutEffect(() => {
    if (asked) list.current?.focus();
  }, [asked]);
  if (faults.value.length === 0 || (!demanded.value && faults.value.every(({ path }) => lineOf(path)))) return null;
  return (
    <section ref={list} class="fault-list" tabIndex={-1} aria-labelledby="fault-title">
      <h3 id="fault-title">Not complete</h3>
      <ul>
        {faults.value.map(({ path, code, text }) => (
          <li key={`${path}${code}`}>
            {lineOf(path) ? (
              <FieldLink path={path} kind="plain">
                {text}
              </FieldLink>
            ) : (
              text
            )}
          </li>
        ))}
      </ul>
    </section>
  );
};
