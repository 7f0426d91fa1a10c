import { beforeAll, beforeEach, describe, expect, test, vi } from 'vitest';
import { webBoltsOf } from '../../../core/end/jointParts.ts';
import { INCH } from '../../../core/units/systems.ts';
import * as state from '../../../web/state/bench.ts';
import { choose } from '../../../web/state/choose.ts';
import { demoEntry } from '../../../web/state/demo.ts';
import * as edits from '../../../web/state/edits.ts';
import { emptyEntry } from '../../../web/state/entry.ts';
import * as fieldText from '../../../web/state/fieldText.ts';
import { entryFrom } from '../../../web/state/keep.ts';
import { notice } from '../../../web/state/notice.ts';
import { openedFile, openedLink, openedText } from '../../../web/state/opened.ts';
import '../../../web/state/reader.ts';
import { otherFamilies } from '../../../web/state/sections.ts';

const bench = { ...state, ...edits, ...fieldText, choose };

beforeAll(() => vi.waitFor(() => expect(otherFamilies.value).toBe(true)));

beforeEach(() => {
  bench.begin(demoEntry());
  bench.editing.value = null;
  bench.demanded.value = false;
});

const texts = () => bench.entry.value.texts;
const steps = () => bench.timeline.value.done.map(({ name }) => name);

describe('the bench', () => {
  test('the demo is complete, holds, and says that it is a demo', () => {
    expect(bench.lastGood.value?.report.verdict).toBe('holds');
    expect(texts()['sheet.job']).toMatch(/\(demo\)$/);
  });

  test('a half-typed field leaves the last good result in place, marked as not current, and says what is missing', () => {
    const before = bench.lastGood.value;
    bench.editing.value = 'joint.firstRow';
    bench.write('joint.firstRow', '');
    expect(bench.isCurrent.value).toBe(false);
    expect(bench.lastGood.value).toBe(before);
    expect(bench.faults.value.map(({ text }) => text)).toEqual(['First bolt row is needed.']);
    bench.write('joint.firstRow', '9O');
    expect(bench.faults.value).toMatchObject([{ path: 'joint.firstRow', code: 'unknown-unit' }]);
    expect(bench.faultAt('joint.firstRow')).toBe('');
    bench.leave('joint.firstRow');
    expect(bench.faultAt('joint.firstRow')).not.toBe('');
    expect(bench.shown('joint.firstRow')).toBe('9O');
    bench.write('joint.firstRow', '90');
    expect(bench.isCurrent.value).toBe(true);
  });

  test('a name that is not known is said even while another field cannot be read', () => {
    bench.write('beam.section', 'UB 40');
    bench.write('setback', 'ten');
    bench.write('joint.firstRow', '');
    expect(bench.faults.value.map(({ path, code }) => `${path} ${code}`)).toEqual([
      'beam.section unknown-section',
      'setback not-a-quantity',
      'joint.firstRow missing',
    ]);
  });

  test('an empty field is not complained of until a sheet is asked for', () => {
    bench.begin(emptyEntry('sans-10162-1', 'mm-kN'));
    expect(bench.lastGood.value).toBeNull();
    expect(bench.faults.value.length).toBeGreaterThan(5);
    expect(bench.faultAt('setback')).toBe('');
    bench.demanded.value = true;
    expect(bench.faultAt('setback')).toBe('Setback is needed.');
  });

  test('an optional field that cannot be read never counts as absent', () => {
    bench.write('top.radius', 'sharp');
    expect(bench.isCurrent.value).toBe(false);
    expect(bench.faults.value).toHaveLength(1);
  });

  test('switching units there and back leaves every result and every field as it was', () => {
    const before = bench.lastGood.value!.report;
    bench.setUnits('in-kip');
    const between = bench.lastGood.value!.report;
    expect(between.units).toBe('in-kip');
    expect(between.verdict).toBe(before.verdict);
    expect((between.capacity! * 4448.2216152605) / 1000).toBeCloseTo(before.capacity!, 9);
    expect(bench.shown('joint.bolts.pitch')).toBe('3.15');
    expect(80 / INCH).toBeCloseTo(3.15, 3);
    bench.setUnits('mm-kN');
    expect(bench.lastGood.value!.report).toEqual(before);
    expect(bench.shown('joint.bolts.pitch')).toBe('80');
  });

  test('the units stay as they are while a field cannot be read: 1.234 might turn from mm to inches', () => {
    bench.write('setback', '1.234');
    const before = texts();
    bench.setUnits('in-kip');
    expect(bench.units.value).toBe('mm-kN');
    expect(texts()).toEqual(before);
    expect(notice.value).toMatchObject({ kind: 'refused' });
    expect(bench.faultAt('setback')).toMatch(/Write one of these: 1234, 1.2340/);
  });

  test('a notch that is switched on gets proposed sizes, marked as assumed until one is touched', () => {
    bench.choose('bottom', 'on');
    expect(bench.isCurrent.value).toBe(true);
    expect(bench.isAssumed('bottom.length')).toBe(true);
    expect(bench.isAssumed('bottom.depth')).toBe(true);
    bench.write('bottom.depth', '40');
    expect(bench.isAssumed('bottom.depth')).toBe(false);
    expect(bench.isAssumed('bottom.length')).toBe(true);
    bench.undo();
    bench.undo();
    expect(texts().bottom).toBe('none');
    expect(texts()).not.toHaveProperty(['bottom.length']);
  });

  test('a second column gets a proposed gauge when its field is left, as part of the same step', () => {
    bench.write('joint.bolts.columns', '2');
    bench.leave('joint.bolts.columns');
    expect(bench.isAssumed('joint.bolts.gauge')).toBe(true);
    expect(steps()).toEqual(['Number of bolt columns 1 → 2']);
    bench.undo();
    expect(texts()).not.toHaveProperty(['joint.bolts.gauge']);
  });

  test('bolting the web to a ply proposes the sizes of the fin plate, and the way back finds the plate and its weld', () => {
    bench.choose('joint.kind', 'web-bolts');
    expect(bench.isCurrent.value).toBe(true);
    expect(bench.isAssumed('joint.ply.thickness')).toBe(true);
    bench.choose('joint.kind', 'fin-plate');
    expect(texts()['joint.weld.leg']).toBe('7');
  });

  test('own sizes and own strengths begin with those of the named section and grade', () => {
    const capacity = bench.lastGood.value!.report.capacity!;
    bench.choose('beam.section.by', 'sizes');
    bench.choose('beam.grade.by', 'strength');
    expect(texts()['beam.section.depth']).toBe('355');
    expect(texts()['beam.grade.fy']).toBe('355');
    expect(bench.lastGood.value!.report.capacity).toBeCloseTo(capacity, 9);
  });

  test('arrow keys step by 5 mm, thin sizes by 1 mm, with Shift by 10 mm, and stop above zero', () => {
    bench.step('joint.bolts.pitch', 1);
    expect(texts()['joint.bolts.pitch']).toBe('85');
    bench.step('joint.bolts.pitch', -1, true);
    expect(texts()['joint.bolts.pitch']).toBe('75');
    bench.step('joint.weld.leg', 1);
    expect(texts()['joint.weld.leg']).toBe('8');
    bench.step('joint.weld.leg', -1, true);
    expect(texts()['joint.weld.leg']).toBe('8');
    bench.step('joint.bolts.rows', -1, true);
    expect(texts()['joint.bolts.rows']).toBe('2');
    expect(steps()).toEqual(['Pitch 80 → 75', 'Weld leg 7 → 8', 'Number of bolt rows 3 → 2']);
  });

  test('in inches they step by quarters and sixteenths', () => {
    bench.setUnits('in-kip');
    bench.write('joint.bolts.pitch', '3');
    bench.step('joint.bolts.pitch', 1);
    expect(texts()['joint.bolts.pitch']).toBe('3-1/4');
    bench.write('joint.weld.leg', '5/16');
    bench.step('joint.weld.leg', -1);
    expect(texts()['joint.weld.leg']).toBe('1/4');
  });

  test('sixteenths of an inch are shown as fractions however they are typed; other sizes as they stand', () => {
    bench.setUnits('in-kip');
    for (const [typed, shown] of [
      ['3.25', '3 1/4'],
      ['3-1/4', '3 1/4'],
      ['1 1/2', '1 1/2'],
      ['0.0625', '1/16'],
      ['4', '4'],
      ['3.3', '3.3'],
      ['3.14159265', '3.14159265'],
    ] as const) {
      bench.editing.value = 'joint.bolts.pitch';
      bench.write('joint.bolts.pitch', typed);
      expect(bench.shown('joint.bolts.pitch')).toBe(typed);
      bench.leave('joint.bolts.pitch');
      expect(bench.shown('joint.bolts.pitch')).toBe(shown);
      const pitch = () => webBoltsOf(bench.lastGood.value!.end.joint)!.bolts.pitch;
      const value = pitch();
      bench.write('joint.bolts.pitch', shown);
      expect(pitch()).toBe(value);
    }
    bench.write('reaction', '34.25');
    expect(bench.shown('reaction')).toBe('34.25');
  });

  test('a number written in another unit is shown in the unit of the end once its field is left', () => {
    bench.editing.value = 'setback';
    bench.write('setback', '1/2 in');
    expect(bench.shown('setback')).toBe('1/2 in');
    expect(bench.readAs('setback')).toBe('read as 12.7 mm');
    bench.leave('setback');
    expect(bench.shown('setback')).toBe('12.7');
  });

  test('opening another end is one step; undo brings back the end that was there', () => {
    const before = texts();
    bench.replace(emptyEntry('sans-10162-1', 'in-kip'), 'New end');
    expect(bench.lastGood.value).toBeNull();
    bench.undo();
    expect(texts()).toEqual(before);
    expect(bench.isCurrent.value).toBe(true);
  });
});

describe('files and links', () => {
  const refused = (opened: Awaited<ReturnType<typeof openedFile>>) => ('refused' in opened ? opened.refused : []);
  const bytes = (text: string) => new TextEncoder().encode(text);

  test('a bad file is refused in words', async () => {
    expect(refused(openedText('{"mark": '))[0]).toMatch(/not readable as JSON/);
    expect(refused(openedText('[]'))).toEqual(['This holds no beam end.']);
    expect(refused(openedText('{"standard":"sans-10162-1"}')).join(' ')).toMatch(/Setback is needed/);
    expect(refused(await openedFile(bytes(`"${'x'.repeat(70000)}"`)))[0]).toMatch(/larger than 65536 bytes/);
    expect(refused(await openedFile(bytes('%PDF-1.7 nothing of ours')))).toEqual(['This holds no beam end.']);
    expect(refused(await openedFile(Uint8Array.of(0xff, 0xfe, 0)))).toHaveLength(1);
  });

  test('a damaged link is refused in words', async () => {
    for (const link of ['1.AAAA.00000000', '9.abc.00000000', '1.!!.00000000', `1.${'A'.repeat(9000)}.00000000`]) {
      const [sentence] = refused(await openedLink(link));
      expect(sentence).toMatch(/^[A-Z].*\.$/);
      expect(sentence).not.toMatch(/was not understood|nothing/);
    }
  });

  test('only a whole entry is restored from what the browser kept', () => {
    const entry = demoEntry();
    expect(entryFrom(JSON.parse(JSON.stringify(entry)))).toEqual(entry);
    for (const bad of [
      null,
      [],
      'x',
      {},
      { ...entry, units: 'mm' },
      { ...entry, texts: { a: 1 } },
      { ...entry, assumed: [1] },
    ]) {
      expect(entryFrom(bad)).toBeUndefined();
    }
  });
});
