import { fixed, MINUS, plain } from '../units/figures.ts';
import { toSystem, type UnitSystem } from '../units/systems.ts';

const SIXTEENTHS = 16;
const NO_BREAK = '\u00a0';

/** A length held in mm as a drawing writes it: mm plain; inches in sixteenths where the value is one, else with decimals. */
export const length = (mm: number, units: UnitSystem): string =>
  units === 'mm-kN' ? plain(mm) : inches(toSystem(mm, '1,0', units));

/** A force held in N, to 0.1 kN or kip. */
export const force = (newtons: number, units: UnitSystem): string => fixed(toSystem(newtons, '0,1', units), 1);

/** A reaction held in N as it was given. */
export const reaction = (newtons: number, units: UnitSystem): string => plain(toSystem(newtons, '0,1', units));

/** A stress held in MPa, to 0.1 MPa or ksi. */
export const stress = (mpa: number, units: UnitSystem): string => fixed(toSystem(mpa, '-2,1', units), 1);

export const forceUnit = (units: UnitSystem): string => (units === 'mm-kN' ? 'kN' : 'kip');
export const stressUnit = (units: UnitSystem): string => (units === 'mm-kN' ? 'MPa' : 'ksi');

const inches = (value: number): string => {
  const parts = Math.round(Math.abs(value) * SIXTEENTHS);
  if (Math.abs(Math.abs(value) * SIXTEENTHS - parts) > 1e-6) return plain(value, 3);
  const whole = Math.trunc(parts / SIXTEENTHS);
  let over = parts % SIXTEENTHS;
  if (over === 0) return plain(Math.sign(value) * whole, 0);
  let under = SIXTEENTHS;
  while (over % 2 === 0) {
    over /= 2;
    under /= 2;
  }
  const fraction = `${over}/${under}`;
  return `${value < 0 ? MINUS : ''}${whole === 0 ? fraction : `${whole}${NO_BREAK}${fraction}`}`;
};
