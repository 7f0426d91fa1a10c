import { saidThere } from './northAmerica.ts';
import type { Region } from './regions.ts';

interface AdviceWords {
  /** By which rule a size is proposed, by its code. */
  readonly rules: Readonly<Record<string, string>>;
  /** Where the beam clears that flange of its support. */
  readonly noneNeeded: string;
  /** Where a proposal leaves rules unmet; their names follow. */
  readonly unmet: string;
  /** Why nothing can be proposed, by the code of the fault. */
  readonly faults: Readonly<Record<string, string>>;
}

const commonwealth: AdviceWords = {
  rules: {
    'past-flange': 'Past the tip of the supporting flange, with the usual room.',
    'clear-of-hole': 'Longer than the flange asks, so that the face of the notch cuts no hole.',
    'past-last-column': 'Past the holes of the last bolt column, as this standard has notches checked.',
    'usual-depth':
      'The usual cut, measured from the face of the supporting flange, or past flange and fillet of support and beam where these are deeper.',
    'past-fillets': 'Just past flange and fillet of support and beam: the usual depth leaves too little web.',
    'past-girder-k':
      'Past flange and fillet of support and beam. The fillet is the one for design: check the depth against the detailing k of the support.',
    'usual-radius': 'The usual corner.',
  },
  noneNeeded: 'The beam clears this flange of its support: no notch is needed.',
  unmet: 'The proposed notch does not meet: ',
  faults: {
    'no-supporting-beam':
      'Notches are proposed from a supporting beam: give a section of the library as support at its web.',
    'support-out-of-reach':
      'With {field} at {given} the supporting beam stands wholly above or below this one; it must be {limit}.',
    'step-not-positive': 'Sizes are rounded up to a step; it must be more than nothing, not {given}.',
  },
};

const byRegion: Readonly<Record<Region, AdviceWords>> = { commonwealth, 'north-america': saidThere(commonwealth) };

/** What is said of proposed copes, in a region's trade words. */
export const adviceWordsFor = (region: Region): AdviceWords => byRegion[region];
