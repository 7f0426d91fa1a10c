import type { Note, Report } from '../../core/check/report.ts';
import { JsonWriter, part } from './jsonWriter.ts';
import { writeCheck } from './writeCheck.ts';
import { writeSection } from './writeSection.ts';

const COMMA = part(',');
const CODE = part('{"code":');
const TEXT = part(',"text":');
const PATH = part(',"path":');
const END = part('}');

const writeNote = (writer: JsonWriter, { code, text, path }: Note): void => {
  writer.put(CODE);
  writer.text(code);
  writer.put(TEXT);
  writer.text(text);
  if (path !== undefined) {
    writer.put(PATH);
    writer.text(path);
  }
  writer.put(END);
};

type Write<Item> = (writer: JsonWriter, item: Item) => void;

const writeList = <Item>(writer: JsonWriter, before: Uint8Array, items: readonly Item[], write: Write<Item>): void => {
  writer.put(before);
  for (let at = 0; at < items.length; at += 1) {
    if (at > 0) writer.put(COMMA);
    write(writer, items[at]!);
  }
};

const CHECKS = part(',"checks":[');
const SECTIONS = part('],"shape":{"sections":[');
const ASSUMPTIONS = part(']},"assumptions":[');
const NOTES = part('],"notes":[');
const REST = part('],');

const writer = new JsonWriter();

/** Fields of an object in JSON, without what opens and closes it. */
const fields = (of: object): string => JSON.stringify(of).slice(1, -1);

/** What is the same in every report is kept ready; only the numbers and what the end says of itself are written anew. */
const written = (report: Report): Uint8Array<ArrayBuffer> => {
  const { checks, shape, assumptions, notes, options, version, fingerprint, ...head } = report;
  writer.put(part(`{${fields(head)}`));
  writeList(writer, CHECKS, checks, writeCheck);
  writeList(writer, SECTIONS, shape.sections, writeSection);
  writeList(writer, ASSUMPTIONS, assumptions, writeNote);
  writeList(writer, NOTES, notes, writeNote);
  writer.put(REST);
  writer.put(part(`${fields({ options, version, fingerprint })}}`));
  return writer.taken();
};

/** JSON of a report, byte for byte what JSON.stringify makes of it. Workings, different in each report, are left to that. */
export const reportJson = (report: Report): Uint8Array<ArrayBuffer> =>
  report.checks.some(({ working }) => working) ? Buffer.from(JSON.stringify(report)) : written(report);
