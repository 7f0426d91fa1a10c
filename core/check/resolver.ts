import { lengthSize, noSupport, noSupportGiven, type SupportGiven } from '../end/factsOf.ts';
import { type Fault, fault } from '../end/fault.ts';
import { sectionFaults } from '../end/geometryFaults.ts';
import type { End, GradeGiven, SupportBolts, WebBolts } from '../end/schema.ts';
import type { SupportBoltGiven } from '../end/supportBoltFacts.ts';
import type { Section } from '../shape/section.ts';
import type { BoltSteel, Steel, Steels } from '../standards/materials.ts';
import type { Standard } from '../standards/standard.ts';
import { findBoltSize } from '../steel/bolts.ts';
import { findSection } from '../steel/knownSections.ts';
import { nearest } from '../steel/nearest.ts';
import { wrenchRoom } from '../steel/wrenchRoom.ts';
import { fromSystem } from '../units/systems.ts';

/** The label of another list under which a section was found. */
export interface ReadAs {
  readonly label: string;
  readonly list: string;
}

/** Strengths that another standard found for the same end, MPa. */
export interface Carried {
  readonly web: Steel;
  readonly fyf: number;
  readonly plate: Steel;
  readonly support: Steel;
  readonly fub: number;
  /** Of the bolts into the support; 0 where there are none. */
  readonly fubs: number;
}

/** Of a part that is not known. */
export const noSteel: Steel = { fy: 0, fu: 0 };
const noBoltSteel: BoltSteel = { fub: 0, listed: false };
/** A bolt that the standard lists, with a tensile strength carried over from another: its shear strength goes with it. */
const withTensile = ({ fub, shear, listed }: BoltSteel, carried: number): BoltSteel => {
  const scale = carried / fub;
  return { fub: carried, listed, ...(shear && { shear: { in: shear.in * scale, out: shear.out * scale } }) };
};

const noBolt: SupportBoltGiven = {
  d: 0,
  d0: 0,
  dStandard: 0,
  dn: 0,
  socket: 0,
  fub: 0,
  fnv: 0,
  boltListed: false,
  inch: false,
  As: 0,
  threadsIn: true,
};

/** Looks up names and collects what is wrong with them. */
export class Resolver {
  readonly faults: Fault[] = [];

  constructor(
    private readonly end: End,
    private readonly standard: Standard,
  ) {}

  section(): { section: Section; designation: string; readAs: ReadAs | null } | undefined {
    const { section } = this.end.beam;
    if (typeof section === 'string') {
      const found = findSection(section);
      if ('nearest' in found) {
        this.faults.push(fault('unknown-section', 'beam.section', section, found.nearest));
        return undefined;
      }
      const { section: dimensions, designation, readAs, readFrom } = found;
      return { section: dimensions, designation, readAs: readAs ? { label: readAs, list: readFrom ?? '' } : null };
    }
    const k = lengthSize(this.end);
    const own: Section = {
      family: section.family ?? 'I',
      h: section.depth * k,
      b: section.width * k,
      tf: section.flange * k,
      tw: section.web * k,
      r: section.radius * k,
    };
    const wrong = sectionFaults(this.end, own);
    this.faults.push(...wrong);
    return wrong.length > 0 ? undefined : { section: own, designation: '', readAs: null };
  }

  /** Strength of a part, MPa: as given, or of a grade at a thickness in mm. */
  strength(grade: GradeGiven, steels: Steels, thickness: number, path: string): Steel {
    if (typeof grade !== 'string') {
      const { units } = this.end;
      if (grade.fy > grade.fu)
        this.faults.push(fault('strength-impossible', `${path}.fy`, grade.fy, { most: grade.fu }));
      return { fy: fromSystem(grade.fy, '-2,1', units), fu: fromSystem(grade.fu, '-2,1', units) };
    }
    const name = steels.named(grade);
    if (!name) {
      this.faults.push(fault('unknown-grade', path, grade, nearest(grade, steels.grades, 3)));
      return noSteel;
    }
    const found = steels.strengthAt(name, thickness);
    if (!found) {
      const given = Number((thickness / lengthSize(this.end)).toPrecision(8));
      this.faults.push(fault('grade-outside-range', path, given, name));
    }
    return found ?? noSteel;
  }

  /** Yield strength of the flange; the web's where the grade's range ends before the flange. */
  flangeYield({ tf }: Section, web: Steel): number {
    const { grade } = this.end.beam;
    const { sections } = this.standard.materials;
    const name = typeof grade === 'string' ? sections.named(grade) : undefined;
    return name === undefined ? web.fy : (sections.strengthAt(name, tf)?.fy ?? web.fy);
  }

  /** Bolts of one kind: through the web, or into the support; `own`: a tensile strength carried over, MPa. */
  bolt(bolts: WebBolts | SupportBolts | undefined, path: string, own?: number): SupportBoltGiven {
    if (!bolts) return noBolt;
    const { materials } = this.standard;
    const found = findBoltSize(bolts.size);
    if ('nearest' in found) {
      this.faults.push(fault('unknown-bolt-size', `${path}.size`, bolts.size, found.nearest));
      return noBolt;
    }
    const d = found.diameter;
    const dStandard = materials.holeFor(d);
    const d0 = bolts.hole === undefined ? dStandard : bolts.hole * lengthSize(this.end);
    if (d0 < d) {
      const limit = { least: Number((d / lengthSize(this.end)).toPrecision(8)) };
      this.faults.push(fault('hole-smaller-than-bolt', `${path}.hole`, bolts.hole, limit));
    }
    const dn = materials.netHole(d0, bolts.holes ?? materials.holesAssumed, d);
    const { fub, shear, listed } = this.boltSteel(bolts, path, own, d);
    const threadsIn = bolts.threads !== 'out';
    const fnv = shear ? (threadsIn ? shear.in : shear.out) : 0;
    const socket = this.socket(bolts, path, d);
    const { thread, tensileArea: As } = found;
    return { d, d0, dStandard, dn, socket, fub, fnv, boltListed: listed, inch: thread === 'inch', As, threadsIn };
  }

  /** The shop's own socket, which goes over the nut, or that of common practice. */
  private socket(bolts: WebBolts | SupportBolts, path: string, d: number): number {
    const { socket, corners } = wrenchRoom(d);
    if (bolts.socket === undefined) return socket;
    const k = lengthSize(this.end);
    if (bolts.socket * k <= corners) {
      const limit = { above: Number((corners / k).toPrecision(4)) };
      this.faults.push(fault('socket-below-nut', `${path}.socket`, bolts.socket, limit));
    }
    return bolts.socket * k;
  }

  private boltSteel(
    { grade, size }: WebBolts | SupportBolts,
    path: string,
    own: number | undefined,
    d: number,
  ): BoltSteel {
    const { boltGrades, bolt } = this.standard.materials;
    const name = typeof grade === 'string' ? boltGrades.find((one) => one === grade.trim()) : undefined;
    const strength = own ?? (typeof grade === 'string' ? undefined : fromSystem(grade.fu, '-2,1', this.end.units));
    if (strength !== undefined) {
      const listed = name === undefined ? undefined : bolt(name, d);
      return listed ? withTensile(listed, strength) : (bolt(strength, d) ?? noBoltSteel);
    }
    if (name === undefined) {
      this.faults.push(fault('unknown-bolt-grade', `${path}.grade`, grade, boltGrades));
      return noBoltSteel;
    }
    const found = bolt(name, d);
    if (found === undefined) this.faults.push(fault('bolt-grade-not-for-size', `${path}.grade`, grade, size));
    return found ?? noBoltSteel;
  }

  /** Outline of the support; thickness and strength of what the joint is fixed to. */
  support(carried?: Carried): SupportGiven {
    const { support } = this.end;
    if (!support) return noSupportGiven;
    const k = lengthSize(this.end);
    const thickness = (support.thickness ?? 0) * k;
    const found = support.section === undefined ? undefined : findSection(support.section);
    if (found && 'nearest' in found) {
      this.faults.push(fault('unknown-section', 'support.section', support.section, found.nearest));
      return noSupportGiven;
    }
    const section = found?.section;
    const fixedTo = thickness || (section ? (support.kind === 'column-flange' ? section.tf : section.tw) : 0);
    const { webStrengthAt } = this.standard.materials;
    const ofWeb = section && support.kind !== 'column-flange' ? webStrengthAt(section) : 0;
    const steel = carried?.support ?? this.supportSteel(Math.max(fixedTo, ofWeb));
    const { kind } = support;
    if (!section) return { kind, thickness: fixedTo, steel, outline: noSupport };
    const { h, b, tw, tf, r } = section;
    const here = support.kind === 'beam-web';
    const topOfSteel = here ? (support.topOfSteel ?? 0) * k : 0;
    return { kind, thickness: fixedTo, steel, outline: { here, h, b, tw, tf, r, topOfSteel } };
  }

  private supportSteel(thickness: number): Steel {
    const grade = this.end.support?.grade;
    if (grade === undefined) return noSteel;
    return this.strength(grade, this.standard.materials.sections, thickness || 1, 'support.grade');
  }

  level(): void {
    const { level } = this.end;
    if (level !== undefined && level !== this.standard.level) {
      this.faults.push(fault('reaction-level', 'level', level, this.standard.level));
    }
  }
}
