import type { SectionStress } from '../../core/check/report.ts';
import { type JsonWriter, part } from './jsonWriter.ts';

const numbers = [
  'at',
  'area',
  'centroid',
  'inertia',
  'modulusCut',
  'plasticModulus',
  'firstMoment',
  'peakStress',
  'peakAt',
  'meanStress',
  'firstYieldStress',
  'firstYieldReaction',
] as const satisfies readonly (keyof SectionStress)[];

const NAME = part('{"name":');
const fields = numbers.map((name) => ({ name, json: part(`,"${name}":`) }));
const PROFILE = part(',"profile":[[');
const COMMA = part(',');
const NEXT = part('],[');
const END = part(']]}');

export const writeSection = (writer: JsonWriter, section: SectionStress): void => {
  writer.put(NAME);
  writer.text(section.name);
  for (const { name, json } of fields) {
    writer.put(json);
    writer.number(section[name]);
  }
  const { profile } = section;
  for (let at = 0; at < profile.length; at += 1) {
    const [y, tau] = profile[at]!;
    writer.put(at === 0 ? PROFILE : NEXT);
    writer.number(y);
    writer.put(COMMA);
    writer.number(tau);
  }
  writer.put(END);
};
