import { commonwealth } from './commonwealth.ts';
import { northAmerica, saidThere } from './northAmerica.ts';
import type { Words } from './words.ts';

const tables = ['titles', 'short', 'reasons', 'assumptions', 'notes', 'fields'] as const;

/**
 * What is said of joints other than that of the bench's first view, a fin plate on a beam's web, and of a beam opposite. It comes with the
 * sentences of faults, without which no other end is read, and with the rules of further standards.
 */
const ofOtherJoints: Pick<Words, (typeof tables)[number]> = {
  titles: {
    'weld-web, web': 'Web behind the weld',
    'cleat-bearing': 'Bearing on the cleat',
    'cleat-tearout': 'Tear-out of the cleat',
    'cleat-gross-shear': 'Gross shear of the cleat',
    'cleat-net-shear': 'Net shear of the cleat',
    'cleat-block': 'Block tearing of the cleat',
    'cleat-bending': 'Bending of the cleat',
    'cleat-buckling': 'Buckling of the cleat',
    'endplate-bearing': 'Bearing on the end plate',
    'endplate-tearout': 'Tear-out of the end plate',
    'endplate-gross-shear': 'Gross shear of the end plate',
    'endplate-net-shear': 'Net shear of the end plate',
    'endplate-block': 'Block tearing of the end plate',
    'endplate-web-shear': 'Web beside the end plate',
    'weld-web': 'Weld to the web',
    'support-bolt-shear': 'Shear of the support bolts',
    'support-bearing': 'Bearing at the support bolts',
  },
  short: {
    'cleat-bearing': 'Bearing, cleat',
    'cleat-tearout': 'Tear-out, cleat',
    'cleat-gross-shear': 'Gross shear, cleat',
    'cleat-net-shear': 'Net shear, cleat',
    'cleat-block': 'Block tearing, cleat',
    'cleat-bending': 'Cleat bending',
    'cleat-buckling': 'Cleat buckling',
    'endplate-bearing': 'Bearing, end plate',
    'endplate-tearout': 'Tear-out, end plate',
    'endplate-gross-shear': 'Gross shear, end plate',
    'endplate-net-shear': 'Net shear, end plate',
    'endplate-block': 'Block tearing, end plate',
    'endplate-web-shear': 'Web beside end plate',
    'support-bolt-shear': 'Support bolts',
    'support-bearing': 'Bearing, support bolts',
  },
  reasons: {
    'no-support-bolts': 'welded to the support',
    'rows-staggered': 'the rows of web and support pass each other',
    cleats: 'not asked of cleats',
    'pair-of-cleats': 'the two cleats hold each other',
    'full-depth-plate': 'an end plate of the full depth is no simple joint',
    'tie-not-covered': 'a tie force is not covered for this joint',
    'fills-setback': 'the end plate fills it',
    'support-flange': "fixed to a column's flange, which this does not shear",
    'beam-opposite': 'a beam on the other side of the same web',
    'tie-bends-legs': 'a tie force bends the support legs and pulls at what holds them: not covered',
    'one-line-opposite': 'one cleat alone, with a beam on the other side of the same web',
    'opposite-apart': 'the beam opposite does not share every bolt: what each of the two brings on it is not known',
    'weld-above-edge': 'the weld leg is above the most for this thickness',
  },
  assumptions: {
    'threads-assumed-web': 'Web bolts: threads in the shear plane (assumed).',
    'threads-in-web': 'Web bolts: threads in the shear plane.',
    'threads-out-web': 'Web bolts: threads out of the shear plane.',
    'threads-assumed-support': 'Support bolts: threads in the shear plane (assumed).',
    'threads-in-support': 'Support bolts: threads in the shear plane.',
    'threads-out-support': 'Support bolts: threads out of the shear plane.',
    'end-plate-setback': 'The end plate fills the setback: g is its thickness.',
    'heel-at-support': "The cleat's heel stands at the face of the support.",
    'opposite-shares-assumed':
      'The beam opposite shares these bolts, row for row (assumed); else look at both ends together.',
  },
  notes: {
    'opposite-erection':
      'Shared bolts: the first beam stays held, by a bolt of its own or a seat, until the second is bolted (law in places: 29 CFR 1926.756, memory).',
  },
  fields: {
    'joint.ply': 'ply',
    'joint.ply.thickness': 'thickness of the ply',
    'joint.ply.grade': 'grade of the ply',
    'joint.ply.topEdge': 'top edge of the ply',
    'joint.ply.bottomEdge': 'bottom edge of the ply',
    'joint.ply.edge': 'free edge of the ply',
    'joint.cleat': 'cleat',
    'joint.cleat.legs': 'legs of the cleat',
    'joint.cleat.legWeb': 'leg on the web',
    'joint.cleat.legSupport': 'leg on the support',
    'joint.cleat.thickness': 'thickness of the cleat',
    'joint.cleat.grade': 'grade of the cleat',
    'joint.cleat.radius': 'root radius of the cleat',
    'joint.cleat.topEdge': 'top edge of the cleat',
    'joint.cleat.bottomEdge': 'bottom edge of the cleat',
    'joint.cleat.top': 'top of the cleat',
    'joint.cleat.depth': 'depth of the cleat',
    'joint.cleat.webWeld': 'weld to the web',
    'joint.cleat.webWeld.leg': 'weld leg at the web',
    'joint.cleat.webWeld.electrode': 'weld metal at the web',
    'joint.cleat.webWeld.return': 'return of the weld',
    'joint.cleat.supportWeld': 'weld to the support',
    'joint.cleat.supportWeld.leg': 'weld leg at the support',
    'joint.cleat.supportWeld.electrode': 'weld metal at the support',
    'joint.cleat.supportWeld.return': 'return of the weld',
    'joint.plate.width': 'width of the end plate',
    'joint.plate.depth': 'depth of the end plate',
    'joint.plate.top': 'top of the end plate',
    'joint.webWeld': 'weld to the web',
    'joint.webWeld.leg': 'weld leg at the web',
    'joint.webWeld.electrode': 'weld metal at the web',
    'joint.supportBolts': 'support bolts',
    'joint.supportBolts.size': 'size of the support bolts',
    'joint.supportBolts.grade': 'grade of the support bolts',
    'joint.supportBolts.threads': 'threads of the support bolts',
    'joint.supportBolts.rows': 'rows of support bolts',
    'joint.supportBolts.pitch': 'pitch of the support bolts',
    'joint.supportBolts.crossCentres': 'cross centres',
    'joint.supportBolts.topEdge': 'top edge at the support bolts',
    'joint.supportBolts.holes': 'holes for the support bolts',
    'joint.supportBolts.hole': 'hole diameter at the support bolts',
    'joint.supportBolts.socket': 'socket for the support bolts',
    'support.opposite': 'bolts of the beam opposite',
    'support.opposite.firstRow': 'first row of the beam opposite',
    'support.opposite.rows': 'rows of the beam opposite',
    'support.opposite.pitch': 'pitch of the beam opposite',
    'support.opposite.gauge': 'cross centres of the beam opposite',
  },
};

const admit = (words: Words, said: typeof ofOtherJoints): void => {
  for (const table of tables) Object.assign(words[table], said[table]);
};

admit(commonwealth, ofOtherJoints);
admit(northAmerica, saidThere(ofOtherJoints));
