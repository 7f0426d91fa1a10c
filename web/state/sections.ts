import { admit, findSection } from '../../core/steel/knownSections.ts';
import { demoSections } from './demo.ts';
import { later } from './later.ts';

admit(demoSections);

/** All families of sections. */
export const otherFamilies = later(async () => {
  await import('../../core/steel/findSection.ts');
  return true as const;
});

const bare = (name: string): string => name.toUpperCase().replace(/\s+/g, '').replace(/[×*]/g, 'X');

/** Written in full as a family at hand has it: no family that is still to come can make it another. */
const isCertain = (name: string): boolean => {
  const found = findSection(name);
  return 'designation' in found && bare(found.designation) === bare(name);
};

/** Whether names of sections can be looked up; families that are not at hand are asked for here where one of the names may be theirs. */
export const lookedUp = (names: readonly string[]): 'there' | 'coming' | 'missed' => {
  if (names.every(isCertain)) return 'there';
  if (otherFamilies.failed) return 'missed';
  return otherFamilies.value ? 'there' : 'coming';
};
