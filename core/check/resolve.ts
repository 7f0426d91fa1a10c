import type { Facts, SupportFacts } from '../end/facts.ts';
import { factsOf, lengthSize, noSupport, type Strengths } from '../end/factsOf.ts';
import { type Fault, fault } from '../end/fault.ts';
import { copeFaults, holeFaults, patternFaults, sectionFaults } from '../end/geometryFaults.ts';
import { type End, type GradeGiven, plyOf } from '../end/schema.ts';
import type { Section } from '../shape/section.ts';
import type { Standard } from '../standards/standard.ts';
import { findBoltSize } from '../steel/bolts.ts';
import { findSection } from '../steel/findSection.ts';
import { nearest } from '../steel/nearest.ts';
import { fromSystem } from '../units/systems.ts';

/** An end whose names are looked up: facts in N and mm, and what the section was read as. */
export interface Resolved {
  readonly section: Section;
  /** Designation of the section, empty for own sizes. */
  readonly designation: string;
  /** The label of another list under which the section was found; null where its own name was given. */
  readonly readAs: { readonly label: string; readonly list: string } | null;
  readonly facts: Facts;
}

/** Looks up names and collects what is wrong with them. */
class Resolver {
  readonly faults: Fault[] = [];

  constructor(
    private readonly end: End,
    private readonly standard: Standard,
  ) {}

  section(): { section: Section; designation: string; readAs: Resolved['readAs'] } | undefined {
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

  strength(grade: GradeGiven, thickness: number, path: string): { fy: number; fu: number } {
    if (typeof grade !== 'string') {
      const { units } = this.end;
      if (grade.fy > grade.fu)
        this.faults.push(fault('strength-impossible', `${path}.fy`, grade.fy, { most: grade.fu }));
      return { fy: fromSystem(grade.fy, '-2,1', units), fu: fromSystem(grade.fu, '-2,1', units) };
    }
    const { grades, strengthAt } = this.standard.materials;
    const name = grades.find((one) => one.toUpperCase() === grade.trim().toUpperCase().replace(/\s+/g, ''));
    if (!name) {
      this.faults.push(fault('unknown-grade', path, grade, nearest(grade, grades, 3)));
      return { fy: 0, fu: 0 };
    }
    const found = strengthAt(name, thickness);
    if (!found) {
      const given = Number((thickness / lengthSize(this.end)).toPrecision(8));
      this.faults.push(fault('grade-outside-range', path, given, name));
    }
    return found ?? { fy: 0, fu: 0 };
  }

  bolt(): { d: number; d0: number; dStandard: number; dn: number; fub: number } {
    const { bolts } = this.end.joint;
    const { materials } = this.standard;
    const found = findBoltSize(bolts.size);
    if ('nearest' in found) {
      this.faults.push(fault('unknown-bolt-size', 'joint.bolts.size', bolts.size, found.nearest));
      return { d: 0, d0: 0, dStandard: 0, dn: 0, fub: 0 };
    }
    const d = found.diameter;
    const dStandard = materials.holeFor(d);
    const d0 = bolts.hole === undefined ? dStandard : bolts.hole * lengthSize(this.end);
    if (d0 < d) {
      const limit = { least: Number((d / lengthSize(this.end)).toPrecision(8)) };
      this.faults.push(fault('hole-smaller-than-bolt', 'joint.bolts.hole', bolts.hole, limit));
    }
    const dn = materials.netHole(d0, bolts.holes ?? materials.holesAssumed);
    return { d, d0, dStandard, dn, fub: this.boltStrength(d) };
  }

  private boltStrength(d: number): number {
    const { grade } = this.end.joint.bolts;
    if (typeof grade !== 'string') return fromSystem(grade.fu, '-2,1', this.end.units);
    const { boltGrades, boltStrength } = this.standard.materials;
    const path = 'joint.bolts.grade';
    const name = boltGrades.find((one) => one === grade.trim());
    if (name === undefined) {
      this.faults.push(fault('unknown-bolt-grade', path, grade, boltGrades));
      return 0;
    }
    const found = boltStrength(name, d);
    if (found === undefined) this.faults.push(fault('bolt-grade-not-for-size', path, grade, this.end.joint.bolts.size));
    return found ?? 0;
  }

  options(): Record<string, string> {
    const known = this.standard.options;
    const inForce: Record<string, string> = {};
    for (const key of Object.keys(known)) inForce[key] = known[key]![0];
    for (const [key, value] of Object.entries(this.end.options ?? {})) {
      const values = Object.hasOwn(known, key) ? known[key] : undefined;
      if (!values) this.faults.push(fault('unknown-option', `options.${key}`, key, Object.keys(known)));
      else if (!values.includes(value)) {
        this.faults.push(fault('unknown-option-value', `options.${key}`, value, values));
      } else inForce[key] = value;
    }
    return inForce;
  }

  /** Outline of a supporting beam, and the thickness of what the joint is fixed to. */
  support(): { outline: SupportFacts; thickness: number } {
    const { support } = this.end;
    const k = lengthSize(this.end);
    const thickness = (support?.thickness ?? 0) * k;
    if (typeof support?.grade === 'string') this.strength(support.grade, thickness || 1, 'support.grade');
    if (support?.section === undefined) return { outline: noSupport, thickness };
    const found = findSection(support.section);
    if ('nearest' in found) {
      this.faults.push(fault('unknown-section', 'support.section', support.section, found.nearest));
      return { outline: noSupport, thickness };
    }
    const { h, b, tw, tf, r } = found.section;
    const fixedTo = thickness || (support.kind === 'column-flange' ? tf : tw);
    if (support.kind !== 'beam-web') return { outline: noSupport, thickness: fixedTo };
    const topOfSteel = (support.topOfSteel ?? 0) * k;
    return { outline: { here: true, h, b, tw, tf, r, topOfSteel }, thickness: fixedTo };
  }

  level(): void {
    const { level } = this.end;
    if (level !== undefined && level !== this.standard.level) {
      this.faults.push(fault('reaction-level', 'level', level, this.standard.level));
    }
  }
}

/** Looks up everything that an end names, and turns it into facts; or says what stands in the way. */
export const resolve = (
  end: End,
  standard: Standard,
): { readonly resolved: Resolved } | { readonly faults: Fault[] } => {
  const resolver = new Resolver(end, standard);
  const { joint, units } = end;
  const k = lengthSize(end);
  resolver.level();
  const beam = resolver.section();
  const ply = plyOf(joint);
  const plyName = joint.kind === 'fin-plate' ? 'plate' : 'ply';
  const web = beam ? resolver.strength(end.beam.grade, beam.section.tw, 'beam.grade') : { fy: 0, fu: 0 };
  const plate = resolver.strength(ply.grade, ply.thickness * k, `joint.${plyName}.grade`);
  const bolt = resolver.bolt();
  const options = resolver.options();
  const support = resolver.support();
  const { faults } = resolver;
  if (bolt.d0 > 0) faults.push(...patternFaults(end, bolt.d0));
  if (beam) faults.push(...copeFaults(end, beam.section));
  if (!beam || faults.length > 0) return { faults };
  const electrode = joint.kind === 'fin-plate' ? joint.weld.electrode : undefined;
  const strengths: Strengths = {
    fy: web.fy,
    fu: web.fu,
    fyp: plate.fy,
    fup: plate.fu,
    ...bolt,
    Xu: electrode === undefined ? standard.materials.electrode : fromSystem(electrode, '-2,1', units),
  };
  const facts = factsOf(end, beam.section, strengths, support, options);
  const holes = holeFaults(end, facts);
  if (holes.length > 0) return { faults: holes };
  return { resolved: { section: beam.section, designation: beam.designation, readAs: beam.readAs, facts } };
};
