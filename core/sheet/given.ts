import { lengthSize } from '../end/factsOf.ts';
import { fittingOf } from '../end/jointParts.ts';
import { fixed } from '../units/figures.ts';
import { capital } from '../words/capital.ts';
import type { Context, Zone } from './context.ts';
import { assumed, gradeName, kept, levelText, type Row } from './givenWords.ts';
import { jointRows } from './jointRows.ts';
import { body } from './page.ts';
import type { TextStyle } from './pen.ts';
import { richText } from './richText.ts';
import { sheetWords as say } from './sheetWords.ts';
import { plainRun, setLines, wrap } from './textBlock.ts';

const { labels } = say;
/** Between the labels and what they name, mm. */
const AIR = 1.5;
const LEADING = 3.68;
const HEADING = 4.4;

/** A designation with the sign of multiplication, as a drawing writes it. */
export const sectionName = (designation: string): string => designation.replace(/(?<=\d)x(?=\d)/g, ' × ');

/** The same without blanks, where room is short. */
export const tightName = (designation: string): string => sectionName(designation).replaceAll(' × ', '×');

const beamRows = (context: Context): Row[] => {
  const { input, numbers } = context;
  const { end, facts, designation } = input;
  const { mm, mpa } = numbers;
  const name = sectionName(designation) || `${say.ownSize} ${mm(facts.h)} × ${mm(facts.b)}`;
  const sizes = `h ${mm(facts.h)}, b ${mm(facts.b)}, t_f ${mm(facts.tf)}, t_w ${mm(facts.tw)}, r ${mm(facts.r)}`;
  const other = say.inSteel[fittingOf(end.joint).path] ?? '';
  const steel = `f_y ${mpa(facts.fy)}, f_u ${mpa(facts.fu)}; ${other} ${mpa(facts.fyp)}, ${mpa(facts.fup)}`;
  return [
    [labels.beam, `${name}, ${gradeName(context, end.beam.grade)}`],
    ['', sizes],
    [labels.steel, steel],
  ];
};

const copeRow = (context: Context): Row => {
  const { input, numbers, words } = context;
  const { facts } = input;
  const one = (edge: 'top' | 'bottom', suffix: string, c: number, d: number, r: number): string =>
    c > 0
      ? `${say[edge]} c_${suffix} ${numbers.mm(c)}, d_${suffix} ${numbers.mm(d)}, ρ_${suffix} ${numbers.mm(r)}${assumed(context, `${edge}.radius`)}`
      : `${say[edge]} ${say.none}`;
  return [
    capital(words.cope),
    `${one('top', 't', facts.ct, facts.dt, facts.rt)}; ${one('bottom', 'b', facts.cb, facts.db, facts.rb)}`,
  ];
};

const loadRows = (context: Context): Row[] => {
  const { input, numbers, words } = context;
  const { end, facts, report } = input;
  const share = typeof end.reaction === 'number' ? '' : say.ofWebShear(fixed(report.shareOfWebShear, 2));
  const level = `${report.level}${assumed(context, 'level')}`;
  const tie = `${say.tie} T ${numbers.load(end.tie ?? 0)}`;
  const arm = facts.tee.here ? facts.tee : facts.rectangle;
  const arms = [
    facts.n > 0 ? `z ${numbers.mm(facts.z)} ${say.toBolts}` : '',
    arm.here ? `e_c ${numbers.mm(arm.ec)} ${say.toCope(words.cope)}` : '',
  ]
    .filter(Boolean)
    .join(', ');
  const loadCase = end.sheet?.loadCase;
  return [
    [labels.reaction, `V ${numbers.load(report.reaction)}${share}, ${level}; ${tie}`],
    ...(loadCase ? [[labels.loadCase, loadCase] as Row] : []),
    ...(arms ? [[labels.arms, arms] as Row] : []),
  ];
};

/** Bolts of the beam opposite, after a comma; nothing where they are not told. */
const oppositeBolts = ({ input, numbers }: Context): string => {
  const given = input.end.support?.opposite;
  if (!given) return '';
  const k = lengthSize(input.end);
  const { rows, firstRow, pitch, gauge } = given;
  const pitches = rows > 1 ? `, p ${numbers.mm((pitch ?? 0) * k)}` : '';
  return `, ${say.itsBolts} 2 × ${rows}, y_1 ${numbers.mm(firstRow * k)}${pitches}, c_c ${numbers.mm(gauge * k)}`;
};

/** Section or thickness of the support; empty where neither is told. */
export const supportName = ({ input, numbers }: Pick<Context, 'input' | 'numbers'>): string => {
  const { section, thickness } = input.end.support ?? {};
  if (section !== undefined) return tightName(section);
  return thickness === undefined ? '' : numbers.mm(thickness * lengthSize(input.end));
};

const otherRows = (context: Context): Row[] => {
  const { input, numbers } = context;
  const { support, piece, end, quantity } = input.end;
  const rows: Row[] = [];
  if (support) {
    const opposite =
      support.otherReaction === undefined
        ? ''
        : `, ${say.opposite} V_o ${numbers.load(support.otherReaction)}${oppositeBolts(context)}`;
    rows.push([
      labels.support,
      `${say.supportKinds[support.kind]} ${supportName(context)}${levelText(context)}${opposite}`,
    ]);
  }
  const off = quantity === undefined ? '' : `${quantity} ${say.off}`;
  const words = [piece, end && say.ends[end], off].filter(Boolean).join(', ');
  if (words) rows.push([labels.piece, words]);
  return rows;
};

/** The data that the checks stand on; `width` mm wide. */
export const givenZone = (context: Context, width: number): Zone => {
  const { pen, numbers, input } = context;
  const style: TextStyle = { ...body, family: 'narrow' };
  const given = [
    ...beamRows(context),
    copeRow(context),
    ...jointRows(context),
    ...loadRows(context),
    ...otherRows(context),
  ];
  const inset = AIR + Math.max(...given.map(([label]) => pen.width(label, style)));
  const rows = given.map(([label, value]) => ({
    label,
    lines: wrap(pen, richText(kept(value), 'prose'), style, width - inset),
  }));
  const count = rows.reduce((sum, { lines }) => sum + lines.length, 0);
  const draw = (x: number, y: number): void => {
    const note = ` ${say.unitNote(numbers.units, input.end.sheet?.decimal ?? '.')}`;
    pen.text(x, y + 3.3, [plainRun(say.given, true), plainRun(note)], style);
    let at = y + HEADING;
    for (const { label, lines } of rows) {
      pen.text(x, at + 2.9, label, style);
      setLines(pen, x + inset, at + 2.9, lines, style, LEADING);
      at += lines.length * LEADING;
    }
  };
  return { height: HEADING + count * LEADING, draw };
};
