import type { CutFacts, Facts } from '../end/facts.ts';
import { plasticModulus } from '../shape/plasticModulus.ts';
import type { Shape } from '../shape/shape.ts';
import { shearPeak, shearProfile } from '../shape/shearStress.ts';
import { toSystem, type UnitSystem } from '../units/systems.ts';
import type { SectionStress } from './report.ts';

/** The curve is drawn, not calculated with: four places are more than any pen shows. */
const drawn = (value: number): number => Math.round(value * 1e4) / 1e4;

const stressesOf = (
  name: SectionStress['name'],
  shape: Shape,
  cut: number,
  at: number,
  f: Facts,
  units: UnitSystem,
): SectionStress => {
  const peak = shearPeak(shape);
  const yieldStress = f.fy / Math.sqrt(3);
  return {
    name,
    at: toSystem(at, '1,0', units),
    area: toSystem(shape.area, '2,0', units),
    centroid: toSystem(shape.centroid, '1,0', units),
    inertia: toSystem(shape.inertia, '4,0', units),
    modulusCut: toSystem(cut, '3,0', units),
    plasticModulus: toSystem(plasticModulus(shape), '3,0', units),
    firstMoment: toSystem(peak.Q, '3,0', units),
    peakStress: toSystem(peak.perNewton * f.V, '-2,1', units),
    peakAt: toSystem(peak.at, '1,0', units),
    meanStress: toSystem(f.V / (f.tw * shape.depth), '-2,1', units),
    firstYieldStress: toSystem(yieldStress, '-2,1', units),
    firstYieldReaction: toSystem(yieldStress / peak.perNewton, '0,1', units),
    profile: shearProfile(shape, f.V).map(
      ([y, tau]) => [drawn(toSystem(y, '1,0', units)), drawn(toSystem(tau, '-2,1', units))] as const,
    ),
  };
};

const cutStresses = (cut: CutFacts, name: SectionStress['name'], f: Facts, units: UnitSystem): SectionStress[] =>
  cut.shape ? [stressesOf(name, cut.shape, cut.W, cut.ec, f, units)] : [];

/** Elastic shear stress through the full section and through what remains behind the copes. Cut channels have none. */
export const sectionStresses = (f: Facts, units: UnitSystem): SectionStress[] => {
  const full = stressesOf('full', f.whole, f.whole.modulusTop, 0, f, units);
  if (f.channel) return [full];
  return [
    full,
    ...cutStresses(f.rectangle, 'rectangle', f, units),
    ...cutStresses(f.tee, f.tee.topCut ? 'tee-bottom' : 'tee-top', f, units),
  ];
};
