import type { CheckPage, Said, StandardPage, WayPage } from '../../core/check/standardPage.ts';
import type { FormulaRow } from '../../core/formula/formulary.ts';
import { optionName, optionValue } from '../../core/words/optionWords.ts';
import { verifiedWords } from '../../core/words/verifiedWords.ts';
import { hanging, WIDTH, wrap } from './wrap.ts';

const caseText = (when: string): string => (when === '' ? '' : when === 'otherwise' ? ', otherwise' : ` where ${when}`);

const compares = (text: string): boolean => /[≤<>≥]/.test(text);

const formulaLines = ({ symbol, cases, under, note }: FormulaRow): string[] => [
  ...cases.flatMap(({ expression, when }, at) =>
    hanging(at === 0 ? `  ${symbol} = ` : `  ${' '.repeat(symbol.length)} = `, `${expression}${caseText(when)}`),
  ),
  ...(under ? wrap(`for ${under}`, WIDTH - 6).map((line) => `      ${line}`) : []),
  ...(note ? wrap(note, WIDTH - 6).map((line) => `      ${line}`) : []),
];

const wayLines = ({ of, formulas }: WayPage): string[] => [
  ...(of ? [`  ${of}:`] : []),
  ...formulas.flatMap(formulaLines),
];

const saidLine = (lead: string, all: readonly Said[]): string[] => {
  if (all.length === 0) return [];
  const reasons = all.map(({ when, reason }) => (compares(when) ? `${reason} (${when})` : reason));
  return hanging(`  ${lead}: `, [...new Set(reasons)].join('; '));
};

const checkLines = (check: CheckPage): string[] => {
  if (check.noRule) return [`${check.title} (${check.id}): ${check.noRule}`];
  const verified = check.verified ? verifiedWords[check.verified] : '';
  return [
    ...wrap(`${check.title} (${check.id}); ${check.clause}, ${check.basis}; ${verified}`, WIDTH),
    ...check.ways.flatMap(wayLines),
    ...saidLine('refers', check.refers),
    ...saidLine('not applicable', check.notApplicable),
  ];
};

/** A standard for a person: edition, factors, options, and every check in symbols; 100 columns. */
export const printStandard = (page: StandardPage): string => {
  const options = Object.entries(page.options).map(([key, values]) =>
    hanging(`  ${key}  `, `${optionName(key)}: ${values.map(optionValue).join(', ')}`).join('\n'),
  );
  const blocks: string[][] = [
    [`${page.title}:${page.edition} (${page.id}), ${page.level} reactions`],
    hanging(
      'Factors: ',
      page.factors.map(({ symbol, value }) => `${symbol} = ${Number(value.toPrecision(6))}`).join(', '),
    ),
    ['Options, the default first:', ...options],
    hanging('Steels of sections: ', page.grades.join(', ')),
    hanging('Steels of plates: ', page.plateGrades.join(', ')),
    hanging('Bolts: ', page.boltGrades.join(', ')),
    ...page.checks.map(checkLines),
    wrap('Local codes govern; licensed practice decides.', WIDTH),
  ];
  return `${blocks.map((lines) => lines.join('\n')).join('\n\n')}\n`;
};
