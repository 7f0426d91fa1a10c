import { fittingOf, type PlacedBolts, webBoltsOf } from '../../end/jointParts.ts';
import type { Cope, GradeGiven } from '../../end/schema.ts';
import { capital } from '../../words/capital.ts';
import type { Zone } from '../context.ts';
import { supportName } from '../given.ts';
import { assumed, holesAssumed, kept, levelText } from '../givenWords.ts';
import { supportBoltRows, weldRows } from '../jointRows.ts';
import { body, LEFT, WIDTH } from '../page.ts';
import type { TextStyle } from '../pen.ts';
import { richText } from '../richText.ts';
import { sheetWords } from '../sheetWords.ts';
import { plainRun, setLines, wrap } from '../textBlock.ts';
import { type CardContext, plateName, size } from './cardContext.ts';
import { cardWords as say } from './cardWords.ts';

type Row = readonly [label: string, value: string];

const LEADING = 3.68;
const HEADING = 4.4;
/** Between the two columns, and between labels and what they name, mm. */
const GAP = 6;
const AIR = 1.8;

const gradeText = ({ numbers }: CardContext, grade: GradeGiven): string =>
  typeof grade === 'string' ? grade : `f_y ${numbers.load(grade.fy)}, f_u ${numbers.load(grade.fu)}`;

const copeText = (context: CardContext, edge: 'top' | 'bottom', cope: Cope | null | undefined): string => {
  if (!cope) return `${sheetWords[edge]} ${sheetWords.none}`;
  const [length, depth, radius] = [cope.length, cope.depth, cope.radius ?? 0].map((one) => size(context, one));
  return `${sheetWords[edge]} ${length} ${say.long}, ${depth} ${say.deep}, ${say.radius} ${radius}${assumed(context, `${edge}.radius`)}`;
};

const copeRows = (context: CardContext): Row[] => {
  const { top, bottom } = context.input.end;
  const label = capital(context.words.cope);
  if (!top && !bottom) return [[label, sheetWords.none]];
  return [
    [label, copeText(context, 'top', top)],
    ['', copeText(context, 'bottom', bottom)],
  ];
};

const boltText = (context: CardContext, { bolts }: PlacedBolts): string => {
  const { facts } = context.input;
  const grade = typeof bolts.grade === 'string' ? bolts.grade : `f_ub ${context.numbers.load(bolts.grade.fu)}`;
  const threads = sheetWords.threads[facts.threadsIn ? 'in' : 'out'] + assumed(context, 'joint.bolts.threads');
  const made = (bolts.holes ?? holesAssumed(context)) + assumed(context, 'joint.bolts.holes');
  return `${bolts.size} ${grade}, ${threads}; ${say.hole(context.numbers.mm(facts.d0), made)}`;
};

const columnText = (context: CardContext, { endDistance, bolts }: PlacedBolts): string => {
  const { columns = 1, gauge = 0 } = bolts;
  const first = say.fromEnd(size(context, endDistance));
  if (columns === 1) return `${say.oneColumn}${assumed(context, 'joint.bolts.columns')}, ${first}`;
  return `${columns}, ${say.first}${first}, ${context.words.gauge} ${size(context, gauge)}`;
};

const fittingRows = (context: CardContext): Row[] => {
  const { numbers, input } = context;
  const { joint } = input.end;
  const { facts } = input;
  const { thickness } = fittingOf(joint);
  const edges = say.edges(numbers.mm(facts.eTop), numbers.mm(facts.eBot), numbers.mm(facts.ex));
  const width = facts.z1 + (facts.m - 1) * facts.q + facts.ex;
  const thick = size(context, thickness);
  const name = capital(plateName(context));
  const { mm } = numbers;
  switch (joint.kind) {
    case 'web-bolts':
      return [[name, `${thick}; ${say.byRows}; ${edges}`]];
    case 'fin-plate': {
      const metal = facts.Xu > 0 ? `, X_u ${numbers.mpa(facts.Xu)}${assumed(context, 'joint.weld.electrode')}` : '';
      return [
        [name, `${thick} × ${mm(width)}, ${say.byRows}; ${edges}`],
        [sheetWords.labels.weld, `${sheetWords.fillets} ${mm(facts.leg)}${metal}`],
      ];
    }
    case 'double-cleat':
    case 'single-cleat': {
      const legs = `${facts.k > 1 ? `${sheetWords.pair} ` : ''}${mm(facts.legWeb)} × ${mm(facts.legSupport)} × ${thick}`;
      const place = facts.n > 0 ? edges : `y_p ${mm(facts.yp)}`;
      return [[name, `${legs}, ${say.byRows}; ${place}`], ...weldRows(context), ...supportBoltRows(context, false)];
    }
    default: {
      const plate = `${thick} × ${mm(facts.bp)}, ${say.byRows}; y_p ${mm(facts.yp)}`;
      return [[name, plate], ...weldRows(context), ...supportBoltRows(context, false)];
    }
  }
};

const supportRows = (context: CardContext): Row[] => {
  const { support } = context.input.end;
  if (!support) return [];
  const name = `${sheetWords.supportKinds[support.kind]} ${supportName(context)}${levelText(context)}`;
  return [[sheetWords.labels.support, name.trim()]];
};

/** What every end of the card has in common: beam and place of the bolts, and the fitting; each in one column. */
const columnsOf = (context: CardContext): readonly (readonly Row[])[] => {
  const { numbers, input, made } = context;
  const { end } = input;
  const { joint } = end;
  const { labels } = say;
  const placed = webBoltsOf(joint);
  const pitch = placed?.bolts.pitch === undefined ? '' : `, ${say.pitch(size(context, placed.bolts.pitch))}`;
  const steel = `${say.beam} ${gradeText(context, end.beam.grade)}, ${plateName(context)} ${gradeText(context, fittingOf(joint).grade)}`;
  const level = `${made.card.level}${assumed(context, 'level')}`;
  return [
    [
      [labels.steel, steel],
      ...copeRows(context),
      [labels.setback, numbers.mm(input.facts.g)],
      [labels.reaction, `${level}; ${sheetWords.tie} ${numbers.load(end.tie ?? 0)}`],
      ...supportRows(context),
    ],
    [
      ...(placed
        ? ([
            [sheetWords.labels.bolts, boltText(context, placed)],
            [labels.columns, columnText(context, placed)],
            [labels.rows, `${say.firstRow(size(context, placed.firstRow))}${pitch}`],
          ] as const)
        : []),
      ...fittingRows(context),
    ],
  ];
};

/** The template in words, in two columns. */
export const cardGivenZone = (context: CardContext): Zone => {
  const { pen, numbers, input } = context;
  const style: TextStyle = { ...body, family: 'narrow' };
  const width = (WIDTH - GAP) / 2;
  const columns = columnsOf(context).map((rows) => {
    const inset = AIR + Math.max(...rows.map(([label]) => pen.width(label, style)));
    const set = rows.map(([label, value]) => ({
      label,
      lines: wrap(pen, richText(kept(value), 'prose'), style, width - inset),
    }));
    return { inset, rows: set, lines: set.reduce((sum, { lines }) => sum + lines.length, 0) };
  });
  const draw = (_x: number, y: number): void => {
    const note = ` ${sheetWords.unitNote(numbers.units, input.end.sheet?.decimal ?? '.')}`;
    pen.text(LEFT, y + 3.3, [plainRun(sheetWords.given, true), plainRun(note)], style);
    columns.forEach(({ inset, rows }, i) => {
      const x = LEFT + i * (width + GAP);
      let at = y + HEADING;
      for (const { label, lines } of rows) {
        pen.text(x, at + 2.9, label, style);
        setLines(pen, x + inset, at + 2.9, lines, style, LEADING);
        at += lines.length * LEADING;
      }
    });
  };
  return { height: HEADING + Math.max(...columns.map(({ lines }) => lines)) * LEADING, draw };
};
