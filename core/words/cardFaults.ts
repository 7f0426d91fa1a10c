import { faultSentences } from './faults.ts';

/** Sentences of what stands in the way of a card, with those of its template. */
export const cardFaultSentences: Readonly<Record<string, string>> = {
  ...faultSentences,
  'unknown-family': 'The section family {given} is not in the library; nearest: {limit}.',
  'unknown-card-field': '{path} is not a field of a card; nearest known: {limit}.',
  'not-a-card': 'This asks for no card: it needs end, and family or sections.',
  'family-or-sections': 'A card is of a family or of a list of sections; give one of the two.',
  'count-outside': '{given} {field} cannot stand on a card; give {limit}.',
  'row-count': '{given} is no count of bolt rows; give whole numbers, {limit}.',
  'nothing-to-print': 'No section of the list carries a reaction with any of these bolt rows: {limit}.',
};
