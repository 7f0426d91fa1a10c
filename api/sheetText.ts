import { examine, said } from '../core/check/examine.ts';
import type { Report, SaidFault } from '../core/check/report.ts';
import { encodeLink } from '../core/exchange/link.ts';
import type { SheetOptions } from '../core/sheet/sheet.ts';
import { read } from './checkText.ts';

/** The sheet of an end, ready to be kept. */
export interface Sheet {
  readonly pdf: Uint8Array<ArrayBuffer>;
  readonly report: Report;
  /** Name for the file, from the mark of the end. */
  readonly name: string;
}

/** Letters that every file system and header takes. */
const fileName = ({ mark, fingerprint }: Report): string =>
  `${[mark.replace(/[^A-Za-z0-9-]+/g, '-').replace(/^-+|-+$/g, ''), fingerprint].filter(Boolean).join('-')}.pdf`;

/** Sets the sheet of an end that is still text. */
export const sheetText = async (
  bytes: Uint8Array,
  options: SheetOptions,
): Promise<Sheet | { readonly faults: readonly SaidFault[] }> => {
  const json = read(bytes);
  if ('fault' in json) return said([json.fault]);
  const examination = examine(json.value, { working: true });
  if ('faults' in examination) return examination;
  const { examined } = examination;
  const { report } = examined;
  // Loaded when it is first needed: most runs print no sheet.
  const { sheetPdf } = await import('../core/sheet/sheet.ts');
  const pdf = await sheetPdf({ ...examined, link: encodeLink(examined.end, report.fingerprint) }, options);
  return { pdf: new Uint8Array(pdf), report, name: fileName(report) };
};
