import { findSection, listSections } from '../../core/steel/findSection.ts';
import { json } from './reply.ts';
import type { Handler } from './route.ts';

/** Free of the noise that inches leave in millimetres. */
const tidy = (value: number): number => Number(value.toPrecision(8));

const familyOf = ({ family, market, designations }: ReturnType<typeof listSections>[number]) => {
  const found = designations.flatMap((name) => {
    const one = findSection(name);
    return 'section' in one ? [one] : [];
  });
  return {
    family,
    market,
    shape: found[0]?.section.family ?? 'I',
    source: found[0]?.source ?? '',
    sections: found.map(({ designation, mass, section: { h, b, tf, tw, r, slope, toe } }) => ({
      designation,
      mass: tidy(mass),
      depth: tidy(h),
      width: tidy(b),
      flange: tidy(tf),
      web: tidy(tw),
      radius: tidy(r),
      ...(slope !== undefined && { slope: tidy((slope * 180) / Math.PI) }),
      ...(toe !== undefined && { toeRadius: tidy(toe) }),
    })),
  };
};

const all = listSections();
let families: ReturnType<typeof familyOf>[] | undefined;

export const familyNames: readonly string[] = all.map(({ family }) => family);

/** The sections that an end can name, of all families or of one. */
export const getSections: Handler = (_request, query) => {
  families ??= all.map(familyOf);
  const wanted = query.family === undefined ? families : families.filter(({ family }) => family === query.family);
  return json({ units: { length: 'mm', mass: 'kg/m' }, families: wanted });
};
