import type { Facts } from '../end/facts.ts';
import { factsOf, lengthSize, type Strengths } from '../end/factsOf.ts';
import type { Fault } from '../end/fault.ts';
import { copeFaults, patternFaults } from '../end/geometryFaults.ts';
import { fittingFaults, holeFaults } from '../end/holeFaults.ts';
import { fittingOf, supportBoltsOf, webBoltsOf, weldOf } from '../end/jointParts.ts';
import type { End } from '../end/schema.ts';
import type { Section } from '../shape/section.ts';
import type { Standard } from '../standards/standard.ts';
import { fromSystem } from '../units/systems.ts';
import { optionsOf } from './optionsOf.ts';
import { type Carried, noSteel, type ReadAs, Resolver } from './resolver.ts';

/** An end whose names are looked up: facts in N and mm, and what the section was read as. */
export interface Resolved {
  readonly section: Section;
  /** Designation of the section, empty for own sizes. */
  readonly designation: string;
  /** The label of another list under which the section was found; null where its own name was given. */
  readonly readAs: ReadAs | null;
  readonly facts: Facts;
}

/**
 * Looks up everything that an end names, and turns it into facts; or says what stands in the way. With strengths carried over from another
 * standard these are taken in place of the grades, and the end's options and level, which are the other's, are left aside.
 */
export const resolve = (
  end: End,
  standard: Standard,
  carried?: Carried,
): { readonly resolved: Resolved } | { readonly faults: Fault[] } => {
  const resolver = new Resolver(end, standard);
  const { joint, units } = end;
  const { sections, plates, cleats, webStrengthAt, electrode } = standard.materials;
  const fitting = fittingOf(joint);
  const steels = 'cleat' in joint ? (cleats ?? plates) : plates;
  if (!carried) resolver.level();
  const beam = resolver.section();
  const web =
    carried?.web ??
    (beam ? resolver.strength(end.beam.grade, sections, webStrengthAt(beam.section), 'beam.grade') : noSteel);
  const plate =
    carried?.plate ??
    resolver.strength(fitting.grade, steels, fitting.thickness * lengthSize(end), `${fitting.path}.grade`);
  const bolt = resolver.bolt(webBoltsOf(joint)?.bolts, 'joint.bolts', carried?.fub);
  const supportBolt = resolver.bolt(supportBoltsOf(joint), 'joint.supportBolts', carried?.fubs);
  const options = optionsOf(carried ? undefined : end.options, standard, resolver.faults);
  const support = resolver.support(carried);
  const { faults } = resolver;
  faults.push(...patternFaults(end, { web: bolt.d0, support: supportBolt.d0 }));
  if (beam) faults.push(...copeFaults(end, beam.section));
  if (!beam || faults.length > 0) return { faults };
  const metal = weldOf(joint)?.electrode;
  const strengths: Strengths = {
    fy: web.fy,
    fu: web.fu,
    fyf: carried?.fyf ?? resolver.flangeYield(beam.section, web),
    fyp: plate.fy,
    fup: plate.fu,
    bolt,
    supportBolt,
    Xu: metal === undefined ? electrode : fromSystem(metal, '-2,1', units),
  };
  const facts = factsOf(end, beam.section, strengths, support, options);
  const outside = [...holeFaults(end, facts), ...fittingFaults(end, facts)];
  if (outside.length > 0) return { faults: outside };
  return { resolved: { section: beam.section, designation: beam.designation, readAs: beam.readAs, facts } };
};
