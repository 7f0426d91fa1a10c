import type { MadeCard } from '../../card/card.ts';
import { canonicalJson } from '../../end/canonical.ts';
import { loadFaces } from '../faces.ts';
import { limitsZones } from '../limitsZone.ts';
import { bottomOf, LEFT, type Paper, papers, TOP } from '../page.ts';
import { writePdf } from '../pdf.ts';
import { Pen } from '../pen.ts';
import { sheetWords } from '../sheetWords.ts';
import { blockHeight, drawTitleBlock } from '../titleBlock.ts';
import { type CardContext, contextOf } from './cardContext.ts';
import { cardGivenZone } from './cardGiven.ts';
import { drawCardHead, HEAD } from './cardHead.ts';
import { legendZone } from './cardLegend.ts';
import { sheetsOf } from './cardSheets.ts';
import { drawTable, tableHeight } from './cardTable.ts';
import { cardWords as say } from './cardWords.ts';
import { unlistedZone } from './unlisted.ts';

/** Air between zones, mm. */
const GAP = 1.6;
const noCode = { code: null, lost: false } as const;

const paperOf = ({ end }: MadeCard): Paper => end.sheet?.paper ?? 'A4';

/** Every sheet stands alone: it says all but the rows of the others. */
const drawCard = (context: CardContext, bottom: number): void => {
  const { pen } = context;
  const given = cardGivenZone(context);
  const common = [legendZone(context), ...limitsZones(context)];
  const block = bottom - blockHeight(context, noCode);
  const top = TOP + HEAD + given.height + GAP;
  const foot = common.reduce((sum, { height }) => sum + height, 0);
  const sheets = sheetsOf(context, block - top - foot - 2 * GAP);
  sheets.forEach(({ rows, lines }, i) => {
    pen.turnTo(i);
    drawCardHead(context);
    given.draw(LEFT, TOP + HEAD);
    let y = top;
    if (rows.length > 0) {
      drawTable(context, rows, top);
      y += tableHeight(rows.length) + GAP / 2;
    }
    for (const zone of [unlistedZone(context, lines), ...common]) {
      zone.draw(LEFT, y);
      y += zone.height;
    }
    drawTitleBlock(context, block, { ...noCode, sheet: i + 1, of: sheets.length });
  });
};

/** The pages of a card as marks in mm, before they become a file. */
export const cardPages = async (made: MadeCard): Promise<Pen> => {
  const pen = new Pen(await loadFaces());
  drawCard(contextOf(made, pen), bottomOf(paperOf(made)));
  return pen;
};

/** The shop card, A4 or Letter as its template says; as many sheets as its sections need. No clock is read: same input and version, same bytes. */
export const cardPdf = async (made: MadeCard): Promise<Uint8Array> => {
  const { card, end } = made;
  const { pages } = await cardPages(made);
  const { date } = end.sheet ?? {};
  return writePdf(pages, {
    paper: papers[paperOf(made)],
    title: say.name,
    subject: say.subject,
    keywords: canonicalJson({ card: card.fingerprint }),
    creator: `${sheetWords.programName} ${card.version}`,
    fingerprint: card.fingerprint,
    ...(date !== undefined && { date }),
  });
};
