import { supportBoltsOf, webBoltsOf, weldOf } from '../end/jointParts.ts';
import type { End } from '../end/schema.ts';
import type { Standard } from '../standards/standard.ts';
import { plain } from '../units/figures.ts';
import { unitOf } from '../units/systems.ts';
import { capital } from '../words/capital.ts';
import { fieldName, filled, type Words } from '../words/words.ts';
import type { Note } from './report.ts';

/** A beam on the other side hangs on the same web. */
const sharesWeb = ({ support }: End): boolean => (support?.otherReaction ?? 0) > 0 && support?.kind !== 'column-flange';

/** Everything that was taken as true without being given, and the limits that hold for every end. */
export const assumptionsOf = (end: End, standard: Standard, channel: boolean, words: Words): Note[] => {
  const notes: Note[] = [];
  const say = (code: string, values: Record<string, unknown> = {}, path?: string) =>
    notes.push({ code, text: filled(words.assumptions[code] ?? code, values), ...(path && { path }) });
  for (const code of ['restraint', 'static', 'bearing']) say(code);
  const { joint } = end;
  const inWeb = webBoltsOf(joint)?.bolts;
  const inSupport = supportBoltsOf(joint);
  const several = inWeb !== undefined && inSupport !== undefined;
  const sets = [
    { bolts: inWeb, path: 'joint.bolts' },
    { bolts: inSupport, path: 'joint.supportBolts' },
  ].flatMap(({ bolts, path }) => (bolts ? [{ bolts, path }] : []));
  const threads = new Set(sets.map(({ bolts }) => bolts.threads));
  for (const { bolts, path } of threads.size > 1 || !several ? sets : sets.slice(0, 1)) {
    const where = threads.size > 1 ? `-${path === 'joint.bolts' ? 'web' : 'support'}` : '';
    if (bolts.threads === undefined) say(`threads-assumed${where}`, {}, `${path}.threads`);
    else say(`threads-${bolts.threads}${where}`);
  }
  for (const code of ['no-axial', 'support', 'square', 'material']) say(code);
  if (channel) say('channel-shear-centre');
  if ('cleat' in joint) say('heel-at-support');
  if (joint.kind === 'end-plate' || joint.kind === 'full-end-plate') say('end-plate-setback', {}, 'setback');
  if (end.level === undefined) say('level-assumed', { value: standard.level }, 'level');
  const unsaid = sets.find(({ bolts }) => bolts.holes === undefined);
  if (unsaid) say('holes-assumed', { value: standard.materials.holesAssumed }, `${unsaid.path}.holes`);
  if (inWeb && inWeb.columns === undefined) say('columns-assumed', {}, 'joint.bolts.columns');
  if (end.tie === undefined) say('tie-assumed', {}, 'tie');
  for (const edge of ['top', 'bottom'] as const) {
    if (end[edge] && end[edge].radius === undefined) {
      say('radius-assumed', { field: capital(fieldName(words, `${edge}.radius`)) }, `${edge}.radius`);
    }
  }
  const weld = weldOf(joint);
  if (weld && weld.electrode === undefined && standard.materials.electrode > 0) {
    const { name, size } = unitOf('-2,1', end.units);
    const value = `${plain(standard.materials.electrode / size, 1)} ${name}`;
    say('electrode-assumed', { value }, `${weld.path}.electrode`);
  }
  if (end.support?.kind === 'beam-web' && end.support.section !== undefined && end.support.topOfSteel === undefined) {
    say('top-of-steel-assumed', {}, 'support.topOfSteel');
  }
  if (sharesWeb(end) && inSupport && !end.support?.opposite) {
    say('opposite-shares-assumed', {}, 'support.opposite.firstRow');
  }
  return notes;
};
