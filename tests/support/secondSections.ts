import { sum } from './sum.ts';

/** Sizes by name, mm or MPa. */
export type Sizes<Name extends string> = Readonly<Record<Name, number>>;
export type OwnSection = Sizes<'depth' | 'width' | 'flange' | 'web' | 'radius'> & { readonly family: 'I' | 'channel' };

const SLICES = 200;

/** What a section is between two levels, mm down from top of steel, summed over strips. */
export const cutOf = (s: OwnSection, top: number, bottom: number) => {
  const { depth: h, flange: tf, radius: r, web: tw } = s;
  const list = [
    { from: 0, to: tf, width: s.width },
    { from: tf, to: h - tf, width: tw },
    { from: h - tf, to: h, width: s.width },
  ];
  const sides = s.family === 'channel' ? 1 : 2;
  for (let i = 0; r > 0 && i < SLICES; i += 1) {
    const angle = (at: number) => (at / SLICES) * (Math.PI / 2);
    const [from, to] = [tf + r * (1 - Math.cos(angle(i))), tf + r * (1 - Math.cos(angle(i + 1)))];
    const width = sides * r * (1 - Math.sin(angle(i + 0.5)));
    list.push({ from, to, width }, { from: h - to, to: h - from, width });
  }
  const strips = list
    .map(({ from, to, width }) => ({ from: Math.max(from, top), to: Math.min(to, bottom), width }))
    .filter(({ from, to }) => to > from);
  const A = sum(strips.map(({ from, to, width }) => width * (to - from)));
  const y = sum(strips.map(({ from, to, width }) => (width * (to ** 2 - from ** 2)) / 2)) / A;
  const I = sum(strips.map(({ from, to, width }) => (width * ((to - y) ** 3 - (from - y) ** 3)) / 3));
  const stressAt = (level: number) => {
    const above = strips.filter(({ from }) => from < level).map((one) => ({ ...one, to: Math.min(one.to, level) }));
    const Q = sum(above.map(({ from, to, width }) => width * (to - from) * (y - (from + to) / 2)));
    return Q / (I * sum(strips.map(({ from, to, width }) => (from <= level && level < to ? width : 0))));
  };
  // Largest at the neutral axis; where that lies in a flange or among fillets, somewhere in the fillets or at the flange.
  const [webTop, webBottom] = [Math.max(top, tf), Math.min(bottom, h - tf)];
  const levels =
    y >= tf + r && y <= h - tf - r
      ? [y]
      : [webTop, y, webBottom - 1e-9, ...strips.map((one) => (one.from + one.to) / 2)];
  const inWeb = levels.filter((level) => level >= webTop && level < webBottom);
  const peak = Math.max(...(inWeb.length > 0 ? inWeb : [y]).map(stressAt));
  return { depth: bottom - top, Wtop: I / (y - top), Wbottom: I / (bottom - y), peak };
};

/** Limiting shear stress of an unstiffened web, MPa, and whether the first limit is passed. */
export const limitingStress = (slenderness: number, fy: number) => {
  const x = slenderness / Math.sqrt(5.34 / fy);
  const beyond = x <= 620 ? (290 * Math.sqrt(5.34 * fy)) / slenderness : (180_000 * 5.34) / slenderness ** 2;
  return { fs: x <= 440 ? 0.66 * fy : beyond, slender: x > 440 };
};
