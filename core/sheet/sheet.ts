import { wordsFor } from '../words/wordsFor.ts';
import type { Context, SheetInput } from './context.ts';
import { endKeywords } from './endInPdf.ts';
import { loadFaces } from './faces.ts';
import { drawHead } from './head.ts';
import { numbersOf } from './numbers.ts';
import { bottomOf, LEFT, type Paper, papers, WIDTH } from './page.ts';
import { writePdf } from './pdf.ts';
import { Pen } from './pen.ts';
import { type Plan, planOf } from './plan.ts';
import { type Code, codeOf, sideOf } from './qr.ts';
import { withSecond } from './second.ts';
import { figureTop } from './secondVerdict.ts';
import { sheetWords as say } from './sheetWords.ts';
import { blockHeight, CODE_ROOM, drawTitleBlock } from './titleBlock.ts';
import { drawVerdict, governingOf } from './verdictLine.ts';
import { allWorked, type Worked } from './workingBlocks.ts';
import { drawFurtherFrame, furtherPages } from './workingPages.ts';

export interface SheetOptions {
  /** `governing`: the working of the check that governs, on the first sheet; `all`: those of all checks on further sheets too. */
  readonly workings: 'governing' | 'all';
}

/** Zones from `top` down; what is left of the height stands between them. */
const drawPlan = (plan: Plan, top: number, blockTop: number): void => {
  const { widths, figure, given, stress, table, footing, working, limits, upper } = plan;
  const used = upper + table.height + footing.height + (working?.height ?? 0) + limits.height;
  const gap = Math.max(0, Math.min(4, (blockTop - top - used - 0.6) / 3));
  figure.draw(LEFT + Math.max(0, (widths.figure - figure.width) / 2), top + Math.max(0, (upper - figure.height) / 2));
  const data = LEFT + WIDTH - widths.data;
  given.draw(data, top);
  stress.draw(data, top + Math.max(given.height + 1, upper - stress.height));
  let y = top + upper + gap;
  table.draw(LEFT, y);
  y += table.height;
  footing.draw(LEFT, y);
  y += footing.height + gap;
  working?.draw(LEFT, y);
  limits.draw(LEFT, y + (working?.height ?? 0));
};

/** The first sheet above its block, which is higher where it must say that no square code stands here. */
const planned = (context: Context, bottom: number, inBlock: Code | null, found: Code | null) => {
  const at = (lost: boolean, beside: Code | null) => {
    const blockTop = bottom - blockHeight(context, { code: inBlock, lost });
    return { plan: planOf(context, blockTop, beside), blockTop, lost };
  };
  const first = at(false, inBlock ? null : found);
  const lost = context.input.link !== undefined && !inBlock && !first.plan.figure.coded;
  return lost ? at(true, null) : first;
};

/** Workings on further sheets: all where they are asked for, else that of the check that governs where it has no room on the first. */
const workedOf = (context: Context, workings: SheetOptions['workings'], { workingLater }: Plan): readonly Worked[] => {
  const { second } = context;
  if (workings === 'all') return [context, ...(second ? [second] : [])].map(allWorked);
  const governing = governingOf(context);
  return workingLater && governing ? [{ under: context, checks: [governing] }] : [];
};

/** All pages as marks. */
const drawSheet = (context: Context, { workings }: SheetOptions, bottom: number): void => {
  const { pen, input } = context;
  const found = input.link === undefined ? null : codeOf(input.link, CODE_ROOM);
  const code = found !== null && sideOf(found) <= CODE_ROOM ? found : null;
  const { plan, blockTop, lost } = planned(context, bottom, code, found);
  const further = furtherPages(context, plan.later, workedOf(context, workings, plan), bottom);
  const of = further.length + 1;
  drawHead(context);
  drawVerdict(context);
  drawPlan(plan, figureTop(context), blockTop);
  drawTitleBlock(context, blockTop, { code, lost, sheet: 1, of });
  further.forEach((draw, i) => {
    pen.turnTo(i + 1);
    drawFurtherFrame(context, bottom, i + 2, of);
    draw();
  });
};

/** The pages of a sheet as marks in mm, before they become a file. */
export const sheetPages = async (input: SheetInput, options: SheetOptions): Promise<Pen> => {
  const { end, report } = input;
  const pen = new Pen(await loadFaces());
  const paper: Paper = end.sheet?.paper ?? 'A4';
  const words = wordsFor(report.words);
  const numbers = numbersOf(report.units, end.sheet?.decimal ?? '.');
  drawSheet(withSecond({ pen, input, numbers, words }), options, bottomOf(paper));
  return pen;
};

/**
 * One page for the job folder, A4 or Letter as the end says, and further pages for workings where they are asked for. Every check of the
 * report needs its working. The file carries the end as JSON; no clock is read: same input and version, same bytes.
 */
export const sheetPdf = async (input: SheetInput, options: SheetOptions): Promise<Uint8Array> => {
  const { end, report } = input;
  const pen = await sheetPages(input, options);
  const { date } = end.sheet ?? {};
  return writePdf(pen.pages, {
    paper: papers[end.sheet?.paper ?? 'A4'],
    title: `${report.mark} ${say.subject}`.trim(),
    subject: say.subject,
    keywords: endKeywords(end),
    creator: `${say.programName} ${report.version}`,
    fingerprint: report.fingerprint,
    ...(date !== undefined && { date }),
  });
};
