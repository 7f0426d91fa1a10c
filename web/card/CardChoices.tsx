import type { Signal } from '@preact/signals';
import type { TargetedEvent } from 'preact';
import { MOST_ROWS } from '../../core/card/readCard.ts';
import { Segments } from '../field/Segments.tsx';
import { by, chosenFamily, chosenPaper, families, family, from, list, paper, to } from './asked.ts';

const kinds = [
  { value: 'family', label: 'A family' },
  { value: 'list', label: 'A list' },
] as const;
const papers = [
  { value: 'A4', label: 'A4' },
  { value: 'Letter', label: 'Letter' },
] as const;
const counts = Array.from({ length: MOST_ROWS }, (_, at) => at + 1);

const Count = ({ label, of }: { readonly label: string; readonly of: Signal<number> }) => (
  <label>
    {label}{' '}
    <select
      class="input"
      value={of.value}
      onChange={(event: TargetedEvent<HTMLSelectElement>) => {
        of.value = Number(event.currentTarget.value);
      }}
    >
      {counts.map((one) => (
        <option key={one} value={one}>
          {one}
        </option>
      ))}
    </select>
  </label>
);

const Family = () => (
  <label>
    Family{' '}
    <select
      class="input"
      value={family.value}
      onChange={(event: TargetedEvent<HTMLSelectElement>) => {
        chosenFamily.value = event.currentTarget.value;
      }}
    >
      {families.value.map((one) => (
        <option key={one} value={one}>
          {one}
        </option>
      ))}
    </select>
  </label>
);

const List = () => (
  <label class="card-list">
    Sections, one a line or with commas between{' '}
    <textarea
      class="input"
      rows={4}
      spellcheck={false}
      value={list.value}
      onChange={(event: TargetedEvent<HTMLTextAreaElement>) => {
        list.value = event.currentTarget.value;
      }}
    />
  </label>
);

/** Which sections and counts of bolt rows the card has, and its paper. */
export const CardChoices = () => (
  <div class="card-choices">
    <Segments
      name="card-by"
      title="Sections of the card"
      choices={kinds}
      inForce={by.value}
      set={(way) => {
        by.value = way;
      }}
    />
    {by.value === 'family' ? <Family /> : <List />}
    <Count label="Bolt rows from" of={from} />
    <Count label="to" of={to} />
    <Segments
      name="card-paper"
      title="Paper"
      choices={papers}
      inForce={paper.value}
      set={(one) => {
        chosenPaper.value = one;
      }}
    />
  </div>
);
