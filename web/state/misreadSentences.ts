import { faultSentences } from '../../core/words/faults.ts';

/** Sentences for what cannot be read in a field or a link, beside those of the core. */
export const sentences: Readonly<Record<string, string>> = {
  'not-a-quantity': '{field} must be a number; {given} is none.',
  'ambiguous-number': '{field}: {given} can be read two ways. Write one of these: {limit}.',
  'fraction-without-unit': '{field}: {given} of what? Write one of these: {limit}.',
  'unknown-unit': '{field}: the unit in {given} is not known. Known here: {limit}.',
  'wrong-unit': '{field}: {given} has a unit of another kind. Known here: {limit}.',
  'link-version': 'This link is of a kind that is not known here.',
  'link-form': 'This is not a whole link: it may have been cut short.',
  'link-letters': 'This link holds signs that no link has: it may have been changed on its way.',
  'link-damaged': 'This link is damaged and cannot be unpacked.',
  ...faultSentences,
};
