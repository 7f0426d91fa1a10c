import { flag } from '../../end/given.ts';
import { constant, pick } from '../../formula/tree.ts';

/** Partial safety factors of IS 800:2007 Table 5: yielding and buckling, rupture, bolts, welds of the shop or of the site. From published notes. */
export const gm0 = constant('γ_m0', 1.1);
export const gm1 = constant('γ_m1', 1.25);
export const gmb = constant('γ_mb', 1.25);
const gmwShop = constant('γ_mw', 1.25);
const gmwSite = constant('γ_mw', 1.5);
const onSite = flag('option weld: site', (f) => f.options.weld === 'site');
/** Of welds: made in the shop, or on site by option. */
export const gmw = pick([[onSite, gmwSite]], gmwShop);
export const factors = [gm0, gm1, gmb, gmwShop, gmwSite] as const;

/** Modulus of elasticity, MPa. */
export const E = constant('E', 200_000, '-2,1');
