import { fittingOf, supportBoltsOf, webBoltsOf, weldOf } from '../end/jointParts.ts';
import type { SupportBolts, WebBolts } from '../end/schema.ts';
import { capital } from '../words/capital.ts';
import type { Context } from './context.ts';
import { assumed, gradeName, holesAssumed, type Row } from './givenWords.ts';
import { sheetWords as say } from './sheetWords.ts';

const { labels } = say;

/** The bolt itself: size, class, strength, threads; and its holes. */
const boltText = (
  { numbers }: Context,
  bolts: WebBolts | SupportBolts,
  { fub, threadsIn }: { readonly fub: number; readonly threadsIn: boolean },
  told: string,
): string => {
  const grade = typeof bolts.grade === 'string' ? ` ${bolts.grade}` : '';
  return `${bolts.size}${grade}, f_ub ${numbers.mpa(fub)}, ${say.threads[threadsIn ? 'in' : 'out']}${told}`;
};

const holeText = (
  context: Context,
  bolts: WebBolts | SupportBolts,
  path: string,
  { d0, dn }: { readonly d0: number; readonly dn: number },
): string => {
  const { mm } = context.numbers;
  const made = (bolts.holes ?? holesAssumed(context)) + assumed(context, `${path}.holes`);
  return `d_0 ${mm(d0)} ${made}, d′ ${mm(dn)}`;
};

const webBoltRows = (context: Context): Row[] => {
  const { facts, end } = context.input;
  const { mm } = context.numbers;
  const placed = webBoltsOf(end.joint);
  if (!placed) return [];
  const { bolts } = placed;
  const columns = facts.m > 1 ? `${facts.m} × ` : '';
  const gauge = facts.m > 1 ? `, q ${mm(facts.q)}` : '';
  const pitch = facts.n > 1 ? `, p ${mm(facts.p)}` : '';
  const told = assumed(context, 'joint.bolts.threads');
  return [
    [labels.bolts, `${columns}${facts.n} ${boltText(context, bolts, facts, told)}`],
    [labels.holes, holeText(context, bolts, 'joint.bolts', facts)],
    [labels.rows, `y_1 ${mm(facts.y1)}${pitch}, e_end ${mm(facts.eEnd)}${gauge}; ${say.setback} g ${mm(facts.g)}`],
  ];
};

/**
 * Bolts into the support. `ofOne`: of one end, with its rows and the edge beside its bolts; else of many, whose cleats stand apart by webs of different
 * thickness.
 */
export const supportBoltRows = (context: Context, ofOne = true): Row[] => {
  const { facts, end } = context.input;
  const { mm } = context.numbers;
  const bolts = supportBoltsOf(end.joint);
  if (!bolts) return [];
  const own = facts.supportBolts;
  const pitch = own.n > 1 ? `, p_s ${mm(own.p)}` : '';
  const edges = `e_v ${mm(own.ev)}${ofOne || facts.legWeb === 0 ? `, e_h ${mm(own.eh)}` : ''}`;
  const told = assumed(context, 'joint.supportBolts.threads');
  const holes = holeText(context, bolts, 'joint.supportBolts', own).replace('d_0 ', 'd_0,s ').replace('d′ ', 'd′_s ');
  const count = ofOne ? `${own.lines} × ${own.n} ` : say.lines(own.lines);
  const bolt = `${count}${boltText(context, bolts, own, told)}`;
  return [[labels.supportBolts, `${bolt}; ${holes}${pitch}, c_c ${mm(own.cc)}, ${edges}`]];
};

const fittingRows = (context: Context): Row[] => {
  const { input, numbers, words } = context;
  const { facts, end } = input;
  const { mm } = numbers;
  const { path, grade } = fittingOf(end.joint);
  const steel = gradeName(context, grade);
  const edges = `e_top ${mm(facts.eTop)}, e_bot ${mm(facts.eBot)}, e_x ${mm(facts.ex)}`;
  const place = facts.n > 0 ? edges : `y_p ${mm(facts.yp)}`;
  switch (facts.kind) {
    case 'web-bolts':
      return [[labels.ply, `${mm(facts.tp)} × ${mm(facts.hp)}, ${steel}; ${place}`]];
    case 'fin-plate': {
      const width = facts.z1 + (facts.m - 1) * facts.q + facts.ex;
      return [[capital(words.finPlate), `${mm(facts.tp)} × ${mm(width)} × ${mm(facts.hp)}, ${steel}; ${place}`]];
    }
    case 'double-cleat':
    case 'single-cleat': {
      const count = facts.k > 1 ? `${say.pair} ` : '';
      const legs = `${mm(facts.legWeb)} × ${mm(facts.legSupport)} × ${mm(facts.tp)}`;
      const cleat = `${count}${legs}, ${say.long} ${mm(facts.hp)}, ${steel}`;
      return [[capital(words.fields[path] ?? ''), `${cleat}; ${place}`]];
    }
    default:
      return [
        [labels.endPlate, `${mm(facts.tp)} × ${mm(facts.bp)} × ${mm(facts.hp)}, ${steel}; ${place}, g ${mm(facts.g)}`],
      ];
  }
};

/** The weld of the joint. */
export const weldRows = (context: Context): Row[] => {
  const { facts, end } = context.input;
  const { mm, mpa } = context.numbers;
  const weld = weldOf(end.joint);
  if (!weld) return [];
  const metal = facts.Xu > 0 ? `, X_u ${mpa(facts.Xu)}${assumed(context, `${weld.path}.electrode`)}` : '';
  const returns = facts.weldReturn > 0 && facts.weldTo === 'web' ? `, l_r ${mm(facts.weldReturn)}` : '';
  const fillets = facts.legWeb > 0 ? say.weldTo[weld.to] : say.fillets;
  return [[labels.weld, `${fillets} s ${mm(facts.leg)}${returns}${metal}`]];
};

/** The data of the joint: bolts through the web, plate or cleat, weld, bolts into the support. */
export const jointRows = (context: Context): Row[] => [
  ...webBoltRows(context),
  ...fittingRows(context),
  ...weldRows(context),
  ...supportBoltRows(context),
];
