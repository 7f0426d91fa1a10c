import type { End } from '../../core/end/schema.ts';

/** The end as the text of a file: its public JSON, fields in the order of the trade, small parts on one line. The same end gives the same text. */
export const fileText = (end: End): string => `${lines(end, '')}\n`;

const WIDE = 100;

const lines = (value: unknown, indent: string): string => {
  const short = onOneLine(value);
  if (typeof value !== 'object' || value === null || (indent !== '' && short.length <= WIDE)) return short;
  const deeper = `${indent}  `;
  const parts = Object.entries(value).map(([key, one]) => `${deeper}${JSON.stringify(key)}: ${lines(one, deeper)}`);
  return `{\n${parts.join(',\n')}\n${indent}}`;
};

/** No field of an end is a list. */
const onOneLine = (value: unknown): string => {
  if (typeof value !== 'object' || value === null) return JSON.stringify(value);
  const parts = Object.entries(value).map(([key, one]) => `${JSON.stringify(key)}: ${onOneLine(one)}`);
  return parts.length === 0 ? '{}' : `{ ${parts.join(', ')} }`;
};
