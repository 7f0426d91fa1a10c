import { examine } from '../../core/check/examine.ts';
import { encodeLink } from '../../core/exchange/link.ts';
import { sheetPdf } from '../../core/sheet/sheet.ts';

/** One sheet of an end, from its JSON to the bytes of its PDF. */
export const sheetTurn = async (end: unknown): Promise<Uint8Array> => {
  const found = examine(end);
  if ('faults' in found) throw new Error('the end is refused');
  const { examined } = found;
  return sheetPdf(
    { ...examined, link: encodeLink(examined.end, examined.report.fingerprint) },
    { workings: 'governing' },
  );
};
