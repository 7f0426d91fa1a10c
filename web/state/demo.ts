import { canonicalJson } from '../../core/end/canonical.ts';
import type { End } from '../../core/end/schema.ts';
import type { SectionTable } from '../../core/steel/sectionTable.ts';
import json from '../../fixtures/demo/citrus-packhouse.json' with { type: 'json' };
import type { Entry } from './entry.ts';
import { entryOf } from './entryOf.ts';

/** The invented end that stands on the bench at the first visit; its job says that it is a demo. */
const demo = json as End;

export const demoEntry = (): Entry => entryOf(demo);

/** The very same end, value for value. */
export const isDemo = (end: unknown): end is End => canonicalJson(end) === canonicalJson(demo);

/** Its two sections out of their family, which comes with all others after the first view. */
export const demoSections: SectionTable = {
  family: 'UB',
  prefix: 'UB ',
  market: 'UK',
  shape: 'I',
  source: 'SCI/BCSA steel section tables (BS EN 10365, BS 4-1)',
  otherList: 'South Africa',
  excerpt: true,
  rows: `
457x191x67 67.1 453.4 189.9 12.7 8.5 10.2
356x171x51 355 171.5 11.5 7.4 10.2
`,
};
