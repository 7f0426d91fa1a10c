import { closingDepth, closingLines, drawClosing } from './closing.ts';
import type { Context } from './context.ts';
import { FRAME, HAIR, LEFT, NARROW, small, WIDTH } from './page.ts';
import type { Pen, TextStyle } from './pen.ts';
import { type Code, drawCode } from './qr.ts';
import { sheetWords as say } from './sheetWords.ts';
import { oneLine } from './textBlock.ts';

const BOXES_LEFT = 29.5;
const SIGN_HEIGHT = 13.2;
/** Base of the first closing line below the block's frame, and what is left below the last one, mm. */
const CLOSING = 25.6;
const BELOW = 0.2;

/** Side of a square code that stands here, mm; its white edges are the page's margin, the gap below the frame and that before the boxes. */
export const CODE_ROOM = 24;

/** What the block of this sheet says beyond the end's own data. */
export interface Block {
  readonly code: Code | null;
  /** True where a code was asked for but found no room. */
  readonly lost: boolean;
  /** Number of this sheet, and of how many. */
  readonly sheet: number;
  readonly of: number;
}

/** Left edge of what stands beside the code. */
const leftOf = ({ code }: Pick<Block, 'code'>): number => LEFT + (code ? BOXES_LEFT : 0);

const closingOf = (context: Context, block: Pick<Block, 'code' | 'lost'>) =>
  closingLines(context, LEFT + WIDTH - leftOf(block), block.lost);

/** Height that the block takes with its closing lines, mm. */
export const blockHeight = (context: Context, block: Pick<Block, 'code' | 'lost'>): number =>
  CLOSING + closingDepth(closingOf(context, block)) + BELOW;

/** Sign-off boxes, revision, fingerprint, program and cautions, from `top` to the foot of the window. */
export const drawTitleBlock = (context: Context, top: number, block: Block): void => {
  const { pen } = context;
  const { code } = block;
  pen.line(LEFT, top, LEFT + WIDTH, top, FRAME);
  if (code) drawCode(pen, LEFT, top + 1.6, code);
  const left = leftOf(block);
  drawSignOff(context, left, top + 1.6);
  drawRevision(context, left, top + SIGN_HEIGHT + 1.9, block);
  drawClosing(context, left, top + CLOSING, closingOf(context, block));
};

const drawSignOff = ({ pen, input }: Context, left: number, top: number): void => {
  const { prepared = '', checked = '', approved = '' } = input.end.sheet ?? {};
  const width = (LEFT + WIDTH - left) / 3;
  const boxes = [
    [say.prepared, prepared],
    [say.checked, checked],
    [say.approved, approved],
  ] as const;
  const style: TextStyle = { size: 9, family: 'narrow' };
  pen.box(left, top, LEFT + WIDTH - left, SIGN_HEIGHT, { width: NARROW });
  boxes.forEach(([label, name], i) => {
    const x = left + i * width;
    if (i > 0) pen.line(x, top, x, top + SIGN_HEIGHT, NARROW);
    pen.text(x + 1.2, top + 3.2, label, small);
    const rule = top + SIGN_HEIGHT - 3.8;
    pen.line(x + 1.2, rule, x + width - 1.2, rule, HAIR);
    if (name) pen.text(x + 1.2, rule - 0.9, oneLine(pen, name, style, width - 24), style);
    pen.text(x + 1.2, rule + 2.9, say.name, small);
    pen.text(x + width - 1.2, rule + 2.9, say.date, { ...small, anchor: 'end' });
  });
};

/** Fingerprint in two groups, easier to compare. */
export const fingerprintText = (fingerprint: string): string => `${fingerprint.slice(0, 4)} ${fingerprint.slice(4)}`;

const drawRevision = ({ pen, input }: Context, left: number, top: number, { sheet, of }: Block): void => {
  const { revision = '', reason = '', date = '' } = input.end.sheet ?? {};
  const { version, fingerprint } = input.report;
  const right = LEFT + WIDTH;
  const room = right - 98 - left;
  const fields: (readonly [x: number, width: number, label: string, value: string])[] = [
    ...(revision
      ? ([
          [left, 16, say.revision, revision],
          [left + 18, room - 18, say.reason, reason],
        ] as const)
      : ([[left, room, say.revision, say.unchecked]] as const)),
    [right - 96, 18, say.dateOfIssue, date],
    [right - 76, 36, say.fingerprint, fingerprintText(fingerprint)],
    [right - 36, 24, say.program, `${say.programName} ${version}`],
    [right - 11, 11, say.sheet, `${sheet} ${say.of} ${of}`],
  ];
  const bold: TextStyle = { size: 9, bold: true };
  for (const [x, width, label, value] of fields) {
    pen.text(x, top + 2.5, label, small);
    if (value) pen.text(x, top + 6.2, oneLine(pen, value, bold, width), bold);
    else drawEmpty(pen, x, top + 3.1, width);
  }
};

/** A box to write in. */
export const drawEmpty = (pen: Pen, x: number, y: number, width: number): void => {
  pen.box(x, y, width, 4, { width: HAIR });
};
