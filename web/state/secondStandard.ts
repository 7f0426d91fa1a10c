import { computed, signal } from '@preact/signals';
import type { SaidFault } from '../../core/check/report.ts';
import type { Listed } from '../../core/standards/listed.ts';
import { entry, listing } from './bench.ts';
import { textOf } from './entry.ts';
import { listedAs } from './rules.ts';

/** Id of the standard that stands beside the first; empty where none does. */
export const secondId = computed<string>(() => textOf(entry.value, 'sheet.beside.standard'));

/** What is listed of it; undefined where this version does not have it. */
export const secondListing = computed<Listed | undefined>(() => listedAs(secondId.value));

/** The level at which the second standard wants its own reaction; null where the first's will do. */
export const otherLevel = computed<Listed['level'] | null>(() => {
  const second = secondListing.value;
  return second && listing.value && second.level !== listing.value.level ? second.level : null;
});

/** Why the second cannot be shown; what shows it fills this in. */
export const secondFaults = signal<readonly SaidFault[]>([]);
