import type { MadeCard } from '../../core/card/card.ts';
import { complete } from '../../core/check/complete.ts';
import type { Examined } from '../../core/check/examined.ts';
import { assumedValues } from './assumedValues.ts';
import { awaited, demanded, examination } from './bench.ts';
import { onceConfirmed } from './confirming.ts';
import { replace } from './edits.ts';
import { entryOf } from './entryOf.ts';
import { fileText } from './fileText.ts';
import { notice, refuse, tell } from './notice.ts';
import { type Opened, openedFile, openedLink } from './opened.ts';
import './reader.ts';

/** The end as it stands, looked at in full; where it is not complete, that is said and its faults are shown. */
const whole = (wanted: string, { working = false } = {}): Examined | undefined => {
  const found = examination.value;
  if ('examined' in found) return complete(found.examined, { working });
  if (awaited.value === 'coming') {
    refuse(`${wanted} waits for rules or sections that are still on their way. Try again in a moment.`);
    return undefined;
  }
  demanded.value = true;
  refuse(`${wanted} needs a complete end: what is missing stands at the top of the order`);
  return undefined;
};

const fileName = ({ end }: Examined, kind: string): string =>
  `${(end.mark ?? '').replace(/[^\w.-]+/g, '-').replace(/^[-.]+|-+$/g, '') || 'end'}.${kind}`;

/** Hands a file to the browser's own way of saving. */
const hand = (data: string | Uint8Array<ArrayBuffer>, type: string, name: string): void => {
  const url = URL.createObjectURL(new Blob([data], { type }));
  const anchor = Object.assign(document.createElement('a'), { href: url, download: name });
  anchor.click();
  setTimeout(() => URL.revokeObjectURL(url), 60_000);
};

/** Saves the end as a file of its public JSON. */
export const saveFile = (): void => {
  const examined = whole('The file');
  if (!examined) return;
  const name = fileName(examined, 'json');
  hand(fileText(examined.end), 'application/json', name);
  const proposed = assumedValues().map(({ text }) => text);
  tell(`Saved as ${name}${proposed.length > 0 ? `. Confirmed by nobody: ${proposed.join(', ')}` : ''}`);
};

const linkText = async ({ end, report }: Examined): Promise<string> => {
  const { encodeLink } = await import('../../core/exchange/link.ts');
  return encodeLink(end, report.fingerprint);
};

const handLink = async (examined: Examined): Promise<void> => {
  const link = `${location.origin}${location.pathname}#${await linkText(examined)}`;
  try {
    await navigator.clipboard.writeText(link);
    tell('Link copied: it carries the whole end');
  } catch {
    notice.value = { kind: 'done', title: 'The link carries the whole end', copy: link };
  }
};

const writeSheet = async (examined: Examined): Promise<void> => {
  try {
    const { sheetPdf } = await import('../../core/sheet/sheet.ts');
    const link = await linkText(examined);
    const name = fileName(examined, 'pdf');
    const bytes = await sheetPdf({ ...examined, link }, { workings: 'governing' });
    hand(new Uint8Array(bytes), 'application/pdf', name);
    tell(`Sheet written as ${name}`);
  } catch (error) {
    refuse('The sheet could not be written', [error instanceof Error ? error.message : String(error)]);
  }
};

/** Copies a link that carries the whole end, once what the bench put in is confirmed; where the browser does not allow it, the link is shown to be copied by hand. */
export const copyLink = (): void => {
  const examined = whole('The link');
  if (examined) onceConfirmed(() => void handLink(examined));
};

/** Writes the sheet of the end as a PDF, once what the bench put in is confirmed. */
export const issueSheet = (): void => {
  const examined = whole('The sheet', { working: true });
  if (examined) onceConfirmed(() => void writeSheet(examined));
};

const writeCard = async (made: MadeCard): Promise<void> => {
  try {
    const { cardPdf } = await import('../../core/sheet/card/card.ts');
    const name = `shop-card-${made.card.fingerprint}.pdf`;
    hand(new Uint8Array(await cardPdf(made)), 'application/pdf', name);
    tell(`Shop card written as ${name}`);
  } catch (error) {
    refuse('The shop card could not be written', [error instanceof Error ? error.message : String(error)]);
  }
};

/** Writes a shop card as a PDF, once what the bench put into its template is confirmed. */
export const issueCard = (made: MadeCard): void => onceConfirmed(() => void writeCard(made));

/** Puts what was opened on the bench, as one step that can be undone; or says why it could not be opened and leaves the bench as it is. */
const take = (opened: Opened, from: string): void => {
  if ('refused' in opened) {
    refuse(`Not opened: ${from}. The bench is as it was.`, opened.refused);
    return;
  }
  replace(entryOf(opened.end), `Opened ${from}`);
  tell(`Opened ${from}. Undo brings back what was there.`);
};

/** Opens the end that the part of an address behind its `#` carries. */
export const openLink = async (text: string): Promise<void> => take(await openedLink(text), 'the link');

/** Opens a file, or a sheet's PDF, that was picked or dropped. */
export const openFile = async (file: File): Promise<void> => {
  try {
    take(await openedFile(new Uint8Array(await file.arrayBuffer())), file.name);
  } catch {
    refuse(`Not opened: ${file.name} could not be read. The bench is as it was.`);
  }
};
