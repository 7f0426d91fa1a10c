import { supportBoltsOf, webBoltsOf } from '../end/jointParts.ts';
import type { End, Joint, SupportBolts, WebBolts } from '../end/schema.ts';
import type { Standard } from '../standards/standard.ts';
import type { UnitSystem } from '../units/systems.ts';
import { fieldName, type Words } from '../words/words.ts';
import type { BoltWords, DrawingWords } from './words.ts';

/** What is known beside the end itself. */
export interface Spoken {
  readonly units: UnitSystem;
  /** The section's designation, as a drawing writes it. */
  readonly section: string;
  /** The region's words. */
  readonly words: Words;
  readonly standard: Pick<Standard, 'weldSymbols'> & {
    readonly materials: Pick<Standard['materials'], 'holesAssumed'>;
  };
}

/** What the drawing of an end writes beside its sizes. */
export const drawingWordsOf = ({ joint }: End, { units, section, words, standard }: Spoken): DrawingWords => {
  const said = (one: WebBolts | SupportBolts): BoltWords => ({
    boltSize: one.size,
    boltGrade: typeof one.grade === 'string' ? one.grade : '',
    holes: one.holes ?? standard.materials.holesAssumed ?? '',
  });
  const inSupport = supportBoltsOf(joint);
  const inWeb = webBoltsOf(joint)?.bolts;
  return {
    units,
    section,
    ...(inWeb ? said(inWeb) : { boltSize: '', boltGrade: '', holes: '' }),
    ...(inSupport && { inSupport: said(inSupport) }),
    cope: words.cope,
    gauge: words.gauge,
    plate: plateName(joint, words),
    weldSymbols: standard.weldSymbols,
  };
};

const plateName = ({ kind }: Joint, words: Words): string => {
  switch (kind) {
    case 'fin-plate':
      return words.finPlate;
    case 'web-bolts':
      return fieldName(words, 'joint.ply');
    case 'double-cleat':
    case 'single-cleat':
      return fieldName(words, 'joint.cleat');
    case 'end-plate':
    case 'full-end-plate':
      return 'end plate';
  }
};
