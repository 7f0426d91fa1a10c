import type { Card, CardRow, Cell } from '../../core/card/card.ts';
import { cardWords as say } from '../../core/sheet/card/cardWords.ts';
import { showQuantity } from '../../core/units/printQuantity.ts';
import { unitOf } from '../../core/units/systems.ts';
import { spokenSection } from '../order/spokenSection.ts';

const hasNumber = ({ cells }: CardRow): boolean => cells.some(({ verdict }) => verdict === 'holds');

const CellShown = ({ cell, card }: { readonly cell: Cell; readonly card: Card }) => {
  if (cell.verdict === 'refer') return <td class="card-refer">{say.refer}</td>;
  if (cell.verdict !== 'holds') {
    return (
      <td>
        <span class="unseen">blank</span>
      </td>
    );
  }
  const letter = card.checks.find(({ id }) => id === cell.governing)?.letter;
  return (
    <td>
      {cell.reaction.toFixed(card.units === 'mm-kN' ? 0 : 1)} <span class="card-letter">{letter}</span>
    </td>
  );
};

/** Sections without any number, in words. */
const Unlisted = ({ sections }: Card) => {
  const rest = sections.filter((one) => !hasNumber(one));
  const referred = rest.filter(({ cells }) => cells.some(({ verdict }) => verdict === 'refer'));
  const groups = [
    [say.referredRows, referred],
    [say.blankRows, rest.filter((one) => !referred.includes(one))],
  ] as const;
  return (
    <>
      {groups.map(
        ([lead, rows]) =>
          rows.length > 0 && (
            <p key={lead}>
              <b>{lead}</b>
              {rows.map(({ section }) => spokenSection(section)).join('; ')}.
            </p>
          ),
      )}
    </>
  );
};

/** The table of a shop card: a row for each section that has a number, a column for each count of bolt rows. */
export const CardTable = ({ card, plate }: { readonly card: Card; readonly plate: string }) => {
  const { units, level, rows, plateDepths, sections } = card;
  const length = unitOf('1,0', units).name;
  return (
    <>
      {/* biome-ignore lint/a11y/noNoninteractiveTabindex: what scrolls sideways on a small screen must be within reach of the keyboard */}
      <section class="card-scroll" aria-labelledby="card-caption" tabIndex={0}>
        <table class="card-table">
          <caption id="card-caption">{say.carries(unitOf('0,1', units).name, level)}</caption>
          <thead>
            <tr>
              <th scope="col">
                Section
                <span class="card-depth">
                  {plate} depth, {length}
                </span>
              </th>
              {rows.map((count, at) => (
                <th key={count} scope="col">
                  {count} {count === 1 ? 'row' : 'rows'}
                  <span class="card-depth">
                    <span class="unseen">{plate}</span> {showQuantity(plateDepths[at]!, '1,0', units)}
                    <span class="unseen"> {length}</span>
                  </span>
                </th>
              ))}
            </tr>
          </thead>
          <tbody>
            {sections.filter(hasNumber).map(({ section, cells }) => (
              <tr key={section}>
                <th scope="row">{spokenSection(section)}</th>
                {cells.map((cell, at) => (
                  <CellShown key={rows[at]} cell={cell} card={card} />
                ))}
              </tr>
            ))}
          </tbody>
        </table>
      </section>
      <Unlisted {...card} />
    </>
  );
};
