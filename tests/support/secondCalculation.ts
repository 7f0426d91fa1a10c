import { type Answer, no, type Part, size, sizes, strength } from './secondAnswers.ts';
import { centreCoefficient, edges, sockets } from './secondBolts.ts';
import { cutOf, limitingStress, type OwnSection, type Sizes } from './secondSections.ts';
import { sum } from './sum.ts';

/**
 * A second calculation of a fin-plate or web-bolts end to SANS 10162-1, written from the rules and not from the program: plain arithmetic on
 * given sizes and strengths, sections as thin strips, nothing of `core`. Reactions in kN; everything else, and every answer, in N, mm, MPa.
 * Where the rules leave room: what a shallow cope leaves of flange and fillet counts in the section; net shear takes h_o for every column;
 * `cautious` takes 0.3 for one column too; the shear of a cut section peaks where its web's V Q/(I t) does.
 */
export interface SecondEnd {
  readonly reaction: number;
  readonly tie: number;
  readonly section: OwnSection;
  readonly web: Strengths;
  readonly top: Cope | null;
  readonly bottom: Cope | null;
  readonly setback: number;
  readonly firstRow: number;
  readonly endDistance: number;
  readonly bolts: Sizes<'d' | 'fu' | 'rows' | 'columns' | 'pitch' | 'gauge'> & {
    readonly threads: 'in' | 'out';
    readonly holes: 'drilled' | 'punched';
    readonly hole?: number;
  };
  /** The fin plate, or the ply of a web bolted straight to it. */
  readonly ply: Strengths & Sizes<'thickness' | 'topEdge' | 'bottomEdge' | 'edge'>;
  /** Of a fin plate. */
  readonly weld?: Sizes<'leg' | 'electrode'>;
  /** A supporting beam. */
  readonly support?: OwnSection & Sizes<'topOfSteel'>;
  readonly options: Readonly<Record<string, string>>;
}
type Strengths = Sizes<'fy' | 'fu'>;
type Cope = Sizes<'length' | 'depth'> & { readonly radius?: number };

/** Every check of the end, by name. */
export const secondCalculation = (end: SecondEnd): Readonly<Record<string, Answer>> => {
  const { section, top, bottom, setback: g, firstRow: y1, endDistance: eEnd, bolts, ply, weld, support, options } = end;
  const { depth: h, flange: tf, web: tw, radius: r } = section;
  const { fy, fu } = end.web;
  const { rows: n, columns: m, d } = bolts;
  const { thickness: tp, topEdge: eTop, bottomEdge: eBot, edge: ex } = ply;
  const [V, T] = [end.reaction * 1000, end.tie * 1000];
  const [p, q] = [n > 1 ? bolts.pitch : 0, m > 1 ? bolts.gauge : 0];
  const d0 = bolts.hole ?? (d <= 24 ? d + 2 : d + 3);
  const dn = bolts.holes === 'drilled' ? d0 : d0 + 2;
  const [dt, db, ct, cb] = [top?.depth ?? 0, bottom?.depth ?? 0, top?.length ?? 0, bottom?.length ?? 0];
  const copes = [top, bottom].filter((one) => one !== null);
  const coped = copes.length > 0;
  const channel = coped && section.family === 'channel';
  const ho = h - dt - db;
  const rows = (n - 1) * p;
  const wide = (m - 1) * q;
  const yn = y1 + rows;
  const columns = Array.from({ length: m }, (_, j) => eEnd + j * q);
  const inside = (cope: Cope | null) => columns.filter((x) => cope && cope.length >= x - d0 / 2).length;
  const [mTop, mBottom] = [inside(top), inside(bottom)];
  const [z, z1] = [g + eEnd + wide / 2, g + eEnd];
  const hp = eTop + rows + eBot;

  const atFace = copes.some(({ length }) => columns.some((x) => Math.abs(x - length) < d0 / 2));
  const always = (atFace && 'hole-at-cope-face') || (copes.some(({ depth }) => depth < tf) && 'flange-left');

  // Sections behind the copes: the rectangle at the shorter cope's face, a tee at the longer one's or behind a single cope.
  const between = top && bottom ? { c: Math.min(ct, cb), ...cutOf(section, dt, h - db) } : undefined;
  const teeTop = top && (!bottom || ct > cb) ? { c: ct, ...cutOf(section, dt, h) } : undefined;
  const teeBottom = bottom && (!top || cb > ct) ? { c: cb, ...cutOf(section, 0, h - db) } : undefined;
  const cuts = [
    between && { ...between, W: Math.min(between.Wtop, between.Wbottom) },
    teeTop && { ...teeTop, W: teeTop.Wtop },
    teeBottom && { ...teeBottom, W: teeBottom.Wbottom },
  ].filter((one) => one !== undefined);

  const onCope = (...parts: readonly Part[]): Answer =>
    channel ? { state: 'refer', reason: 'channel-cope' } : coped ? strength(V, ...parts) : no('no-cope');
  const buckling = (): Part[] => {
    const parts: Part[] = [];
    const long = Math.max(ct, cb) > 2 * h && 'cope-longer-than-method';
    if (between) {
      const [c, deep] = [Math.max(ct, cb), Math.max(dt, db)];
      const fd = 3.5 - (7.5 * deep) / h;
      const Fcr = ((0.62 * Math.PI * 200_000 * tw ** 2) / (c * ho)) * fd;
      const resistance = fd > 0 ? 0.9 * Math.min(Fcr, fy) * Math.min(between.Wtop, between.Wbottom) : Number.NaN;
      const beyond = (fd > 0 && long) || (deep > 0.2 * h && 'cope-deeper-than-method');
      parts.push({ per: g + between.c, resistance, always: always || beyond });
    }
    if (teeTop) {
      const left = h - dt;
      const f = ct <= h ? (2 * ct) / h : 1 + ct / h;
      const k = ct <= left ? 2.2 * (left / ct) ** 1.65 : (2.2 * left) / ct;
      const Fcr = ((Math.PI ** 2 * 200_000) / (12 * (1 - 0.3 ** 2))) * (tw / left) ** 2 * f * k;
      const beyond = long || (dt > h / 2 && 'cope-deeper-than-method');
      parts.push({ per: g + ct, resistance: 0.9 * Math.min(Fcr, fy) * teeTop.Wtop, always: always || beyond });
    }
    return parts;
  };

  const pattern = columns.flatMap((x) =>
    Array.from({ length: n }, (_, i) => [x - eEnd - wide / 2, i * p - rows / 2] as const),
  );
  const J = sum(pattern.map(([x, y]) => x ** 2 + y ** 2));
  const N = n * m;
  const elastic = Math.hypot((z * rows) / 2 / J, 1 / N + (z * wide) / 2 / J);
  const byCentre = options['bolt-group'] === 'instantaneous-centre' && N > 1;
  const long = rows > 15 * d ? Math.max(0.75, 1.075 - (0.005 * rows) / d) : 1;
  const oneBolt = 0.6 * 0.8 * ((Math.PI * d ** 2) / 4) * bolts.fu * (bolts.threads === 'in' ? 0.7 : 1) * long;
  const bearing = (t: number, u: number) => 3 * 0.67 * t * d * u;
  const wideHole = d0 > (d <= 24 ? d + 2 : d + 3) && 'hole-above-standard';
  const onBolt = (resistance: number, per: number, limit: string | false = false): Answer =>
    N > 1
      ? strength(V, { per, resistance, limit })
      : { state: 'fails', reason: 'one-bolt', resistance, reactionAtFailure: 0 };

  const planes = (t: number, y: number, u: number, L: number, Ln: number) =>
    2 * t * Math.min(0.6 * 0.9 * y * L, 0.6 * 0.9 * u * Ln);
  const upright = (t: number, y: number, u: number, edge: number, count: number): Part[] => {
    if (count === 0) return [];
    const one = planes(t, y, u, edge + rows, edge + rows - (n - 0.5) * dn);
    const near = { per: 1 / m + (n * z * wide) / 2 / J, resistance: one };
    return [{ per: 1, resistance: count * one }, ...(m > 1 ? [near] : [])];
  };
  const along = (t: number, y: number, u: number, edge: number): Part[] => {
    const toEdge = planes(t, y, u, edge, edge - dn / 2);
    const resistance = m > 1 ? Math.min(toEdge, planes(t, y, u, q, q - dn)) : toEdge;
    return n > 1 ? [{ per: (z * rows) / 2 / J, resistance }] : [];
  };
  const block = (k: number, t: number, y: number, u: number, Lgv: number, Lgt: number, count: number) => {
    const pull = k * 0.9 * t * (Lgt - (count - 0.5) * dn) * u;
    return pull + 0.6 * 0.9 * t * Math.min(y * Lgv, u * (Lgv - (n - 0.5) * dn));
  };
  // A cope shorter than the end distance may cut into an outer row: the web before the hole then ends at the cope's face.
  const cutInto = (cope: Cope | null, into: boolean) => (cope && into ? cope.length : 0);
  const before = eEnd - Math.max(cutInto(top, y1 - d0 / 2 < dt), cutInto(bottom, yn + d0 / 2 > h - db));
  const webTears = [...upright(tw, fy, fu, y1 - dt, mTop), ...along(tw, fy, fu, before)];
  const k = options['web-block'] === 'cautious' ? 0.3 : 0.5;
  const webBlock = block(k, tw, fy, fu, y1 - dt + rows, eEnd + (mTop - 1) * q, mTop);
  const { fy: yp, fu: up } = ply;

  const slices = (t: number, y: number, u: number, depth: number, edge: number) => [
    N * bearing(t, u),
    0.85 * 0.9 * t * (depth - n * dn) * u,
    0.9 * t * (n - 1) * (p - dn) * u + planes(t, y, u, edge + wide, edge + wide - (m - 0.5) * dn),
  ];
  const line = weld ? (0.67 * 0.67 * weld.electrode * weld.leg) / Math.SQRT2 : 0;
  const rowByRow = (t: number, y: number, u: number, edge: number) =>
    n * planes(t, y, u, edge + wide, edge + wide - (m - 0.5) * dn);
  const tied = Math.min(
    N * oneBolt,
    ...slices(tw, fy, fu, ho, eEnd),
    rowByRow(tw, fy, fu, eEnd),
    ...slices(tp, yp, up, hp, ex),
    rowByRow(tp, yp, up, ex),
    weld ? 2 * hp * line : Number.POSITIVE_INFINITY,
  );
  const tie = (): Answer => {
    if (tied <= 0) return { state: 'fails', reason: 'nothing-left', resistance: tied };
    return { state: T <= tied ? 'holds' : 'fails', demand: T, resistance: tied, utilisation: T / tied };
  };

  const stress = (...peaks: readonly number[]): Answer => {
    const found = strength(V, ...peaks.map((per) => ({ per, resistance: 0.66 * 0.9 * fy })));
    return options['elastic-shear'] === 'verdict' ? found : { ...found, state: 'information' };
  };
  const shear = (slenderness: number) => limitingStress(slenderness, fy);
  const mean = options['cope-shear'] === 'mean';

  const lambda = (hp * Math.sqrt(yp / 6.895)) / (10 * tp * Math.sqrt(475 + 280 * (hp / z1) ** 2));
  const Q = lambda <= 0.7 ? 1 : lambda <= 1.41 ? 1.34 - 0.486 * lambda : 1.3 / lambda ** 2;
  const plateMoment = (0.9 * yp * tp * hp ** 2) / 6;
  const thicker = Math.max(tp, support?.web ?? 0);
  const leastLeg = thicker <= 12 ? 5 : thicker <= 20 ? 6 : 8;

  const [, sheared, cut] = edges.find(([upTo]) => d <= upTo)!;
  const plateEdge = options['plate-edges'] === 'cut' ? cut : sheared;
  const edge = (given: number, least: number, t: number) => size('fails', given, least, Math.min(12 * t, 150));
  const each = (rule: (cope: Cope) => Answer): Answer => (coped ? sizes(...copes.map(rule)) : no('no-cope'));
  const overhang = support ? (support.width - support.web) / 2 : 0;
  const deepEnough = copes.map(({ depth }) => size('refer', depth, tf + r));
  if (support && g < overhang) {
    const root = support.flange + support.radius;
    const [above, below] = [root - support.topOfSteel, h - (support.depth - root - support.topOfSteel)];
    if (above > 0) deepEnough.push(size('refer', dt, above));
    if (below > 0) deepEnough.push(size('refer', db, below));
  }
  const clear = ({ length }: Cope): Answer => {
    const gap = g + length - overhang;
    return gap > 0 ? size('refer', gap, 10) : { ...size('fails', gap, 10), reason: 'clash' };
  };

  /** The plate on the flat of the supporting web; over a flange it cannot be welded. */
  const onWeb = ({ depth, flange, radius, topOfSteel }: NonNullable<typeof support>): Answer[] =>
    [topOfSteel + y1 - eTop, depth - topOfSteel - yn - eBot].map((given) =>
      given < flange
        ? { ...size('fails', given, flange + radius), reason: 'clash' }
        : size('refer', given, flange + radius),
    );

  /** Only a flange of the support that lies within the beam's depth can meet a cope's face. */
  const clearance = (): Answer => {
    const { flange, radius, topOfSteel, depth } = support!;
    const flangeAbove = flange + radius <= topOfSteel;
    const flangeBelow = h <= depth - flange - radius - topOfSteel;
    const near = [...(top && !flangeAbove ? [top] : []), ...(bottom && !flangeBelow ? [bottom] : [])];
    if (near.length > 0) return sizes(...near.map(clear));
    return no(top ? 'clear-of-support' : 'no-top-cope');
  };

  /** Half a socket and 2 mm to a face; past half a wide nut, across its corners, to the next bolt. */
  const wrench = (): Answer[] => {
    const [, socket, nut] = sockets.find(([size]) => size === d)!;
    const reach = socket / 2 + 2;
    const apart = reach + nut / Math.sqrt(3);
    const gone = (cope: Cope | null) =>
      cope !== null && cope.depth >= tf + r - 1e-9 && cope.length >= eEnd + wide + reach - 1e-9;
    return [
      ...(gone(top) ? [] : [size('refer', y1 - tf - r, reach)]),
      ...(gone(bottom) ? [] : [size('refer', h - yn - tf - r, reach)]),
      size('refer', g + eEnd, reach),
      ...(weld ? [size('refer', g + eEnd - weld.leg, reach)] : []),
      ...(n > 1 ? [size('refer', p, apart)] : []),
      ...(m > 1 ? [size('refer', q, apart)] : []),
    ];
  };

  return {
    'web-gross-shear': strength(V, { per: 1, resistance: 0.9 * h * tw * shear((h - 2 * tf) / tw).fs }),
    'stress-full': stress(cutOf(section, 0, h).peak),
    'stress-cope': !coped ? no('no-cope') : channel ? no('channel-cope') : stress(...cuts.map(({ peak }) => peak)),
    'cope-shear': onCope(
      ...cuts.map(({ depth, peak }): Part => {
        const { fs, slender } = shear(depth / tw);
        return {
          per: 1,
          resistance: 0.9 * fs * (mean ? depth * tw : 1 / peak),
          limit: slender && 'slender-cut-web',
          always,
        };
      }),
    ),
    'web-net-shear': strength(V, { per: 1, resistance: 0.6 * 0.9 * fu * tw * (ho - n * dn), always }),
    'web-block': mTop > 0 ? strength(V, { per: 1, resistance: webBlock, always }) : no('intact-flange'),
    'web-tearout': webTears.length > 0 ? strength(V, ...webTears) : no('single-row'),
    'cope-bending': onCope(...cuts.map(({ c, W }) => ({ per: g + c, resistance: 0.9 * fy * W, always }))),
    'cope-buckling': coped && !top ? no('cut-edge-in-tension') : onCope(...buckling()),
    'bolt-shear': onBolt(oneBolt, byCentre ? 1 / centreCoefficient(pattern, z) : elastic),
    'web-bearing': onBolt(bearing(tw, fu), elastic, wideHole),
    'web-tie': T > 0 ? tie() : no('no-tie'),
    'plate-bearing': onBolt(bearing(tp, up), elastic, wideHole),
    'plate-tearout': strength(V, ...upright(tp, yp, up, eBot, m), ...along(tp, yp, up, ex)),
    'plate-gross-shear': strength(V, { per: 1, resistance: 0.6 * 0.9 * yp * tp * hp }),
    'plate-net-shear': strength(V, { per: 1, resistance: 0.6 * 0.9 * up * tp * (hp - n * dn) }),
    'plate-block': strength(V, { per: 1, resistance: block(1, tp, yp, up, eBot + rows, ex + wide, m) }),
    'plate-bending': strength(V, { per: z, resistance: plateMoment }),
    'plate-buckling': z1 <= tp / 0.15 ? no('short-plate') : strength(V, { per: z1, resistance: Q * plateMoment }),
    weld: strength(V, {
      per: Math.hypot(1, (6 * z) / hp) / (2 * hp),
      resistance: line,
      limit: (weld?.leg ?? 0) < leastLeg && 'weld-leg-below-least',
    }),
    'support-shear': support
      ? strength(V, { per: 1, resistance: 2 * 0.6 * 0.9 * fy * support.web * hp })
      : no('no-support'),
    'fit-pitch': n > 1 ? size('fails', p, 2.7 * d) : no('single-row'),
    'fit-gauge': m > 1 ? size('fails', q, 2.7 * d) : no('single-column'),
    'fit-edge-web':
      mTop + mBottom > 0
        ? sizes(
            ...(mTop > 0 ? [edge(y1 - dt, cut, tw)] : []),
            ...(mBottom > 0 ? [size('fails', h - db - yn, cut)] : []),
          )
        : no('intact-flange'),
    'fit-edge-plate': sizes(...[eTop, eBot, ex].map((given) => edge(given, plateEdge, tp))),
    'fit-end': edge(eEnd, cut, tw),
    'fit-plate-depth': sizes(
      size('refer', hp, 0.5 * (h - 2 * (tf + r))),
      size('refer', y1 - eTop, top ? dt : tf + r),
      size('refer', h - yn - eBot, bottom ? db : tf + r),
      ...(support && weld ? onWeb(support) : []),
    ),
    'fit-cope-length': each(({ length }) => size('refer', length, eEnd + wide + d0 / 2)),
    'fit-cope-depth': deepEnough.length > 0 ? sizes(...deepEnough) : no('no-cope'),
    'fit-cope-radius': each(({ radius }) => size('refer', radius ?? 0, 10)),
    'fit-cope-clearance': !support ? no('no-support') : !coped ? no('no-cope') : clearance(),
    'fit-setback': size('refer', g, 8, 20),
    'fit-rotation': weld
      ? sizes(
          size('refer', m > 1 ? Math.max(tp, tw) : Math.min(tp, tw), 0, d / 2 + 2),
          size('refer', weld.leg, 0.625 * tp),
        )
      : no('fin-plates-only'),
    'fit-wrench': sizes(...wrench()),
  };
};
