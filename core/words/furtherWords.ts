import './otherEnds.ts';
import { commonwealth } from './commonwealth.ts';
import { northAmerica, saidThere } from './northAmerica.ts';
import { admitOptions } from './optionWords.ts';
import type { Words } from './words.ts';

/**
 * What only further standards say, beyond the one of the bench's first view. It comes with their rules; sentences of shared code and of the
 * first standard stand in the regions' own files.
 */
const further: Pick<Words, 'reasons' | 'notes'> = {
  reasons: {
    'tie-other-level': 'the tie force is given at the other level',
    'opposite-other-level': 'the reaction of the beam opposite is given at the other level',
    'several-columns': 'two bolt columns or more',
    'three-in-line': 'three bolts or more in line',
    'stocky-web': 'the web yields before it buckles in shear',
    'slender-web': 'the web buckles before it yields in shear',
    'slender-cut': 'the cut web may buckle before it yields in shear',
    'block-as-clause': 'the clause as it stands over-predicts such ends: it may not be what fails first',
    'one-line': 'one line of bolts, whose arm counts',
    'grip-too-long': 'the grip is longer than 8 d',
    'short-weld': 'without a leg at each end the weld is shorter than four legs',
    'thin-throat': 'the throat is below 3 mm',
    'web-below-least': 'the web is thinner than the least for an unstiffened web',
    'slender-cut-panel': 'the cut web is too slender: the rule for panels needs both edges held',
    'hole-above-oversize': 'the holes are wider than oversize holes',
    'rows-below-two': 'the rules for bolt groups need two rows or more',
    'columns-above-two': 'the rules for bolt groups cover two columns at most',
    'short-plate-z': 'short plate, z ≤ t_p/0.15',
    'weld-too-short': 'the weld is too short for its throat',
    'weld-throat-below-least': 'a throat below 3 mm carries no load',
    'outside-cope-limits': 'the notch is outside the published limits',
    'inside-cope-limits': 'the notch is inside the published limits',
    'both-coped': 'both flanges are notched',
    'last-column-at-face': 'the last column stands at the face of the notch',
    'last-column-apart': 'the face stands clear of the last column',
    'conventional-plate': 'not asked of a conventional plate',
    'extended-plate': 'not asked of an extended plate or a web bolted to a ply',
    'ply-not-described': 'the ply beyond the bolts is not described: check it apart',
    'no-hole-in-cope': 'no hole stands in such a section',
    'two-copes': 'two copes are checked together',
    'held-against-twist': 'a slab holds the beam against twist',
    'weld-by-size': 'the leg makes the plate yield first',
    'weld-by-strength': 'checked by its strength',
    'coped-above': 'no flange above',
    'coped-below': 'no flange below',
    'radius-not-stated': 'the radius is not stated',
    'bolts-first': 'the plies are too thick for the bolts to plough',
    ploughing: 'the bolts plough a thin ply before they break',
    'no-end-plate': 'no end plate in this joint',
    'one-cleat': 'the bolts of one cleat stand beside the web: the rules have pairs and end plates only',
    'cleats-only': 'a rule for cleats',
    'end-plates-only': 'a rule for end plates',
    'plates-only': 'a rule for plates beside the web',
    'plates-and-cleats': 'not asked of a web bolted to a ply',
    'bolted-to-support': 'bolted to the support',
    'welded-support-leg': 'no rule says how a cleat welded to its support turns with the end',
    'tie-covered': 'a tie force is covered for this joint',
    'bolts-near-web': 'the support bolts stand too near the web for the rule',
  },
  notes: {
    'conventional-plate':
      'A conventional plate: one column of 2 to 12 bolts within 3-1/2 in of the support, standard holes, edges and thickness within the limits of its kind. Its bending and buckling need no check.',
    'extended-plate':
      'An extended plate: it is outside some limit of the conventional kind (one column of 2 to 12 bolts, z_1 ≤ 3-1/2 in, standard holes, edges as tabled, 2 d to the ends, one ply of d/2 + 1/16 in).',
    'double-cope-arm':
      'Two copes: the arm of the reaction for buckling is taken to the face of the longer one. Option double-cope-arm: top takes the top one.',
    'strengths-carried': 'Strengths carried over from {from}: web {web}, plate {plate}, bolts {bolts}.',
    'least-action':
      'The standard has joints carry the lesser of 0.15 of the shear of the full section and 40 kN at least: a way of failing below that fails at every reaction.',
    'weld-category': 'Welds of category SP are assumed: so the specification must ask. Option weld: GP takes 0.60.',
    'parallel-flanges': 'The flanges are taken as parallel, as given.',
    'half-tension-plane':
      'With two columns or more inside the notch half of the tension plane counts in the block of the web, below the clause: tests found such ends over-predicted. Option web-block: standard takes the clause as it stands.',
    'support-grip':
      "The support's thickness is not told: the grip of its bolts counts leg or plate alone. Beyond 5 d a grip lowers their strength.",
    'tie-in-web-only':
      'Under the tie force the bolts through the web and the web are checked; plate or cleat, weld, and the support with its bolts are not.',
    'web-bolts-no-arm':
      'One column of web bolts within 3 in of the support: the handbook leaves its arm out, and so does this.',
    'pair-no-arm': 'The two cleats hold each other at the support: the arm of their support bolts is left out.',
    'beam-opposite-added':
      'The beam on the other side of the same web is added in bearing and shear of that web; the handbook leaves that to the reader.',
    'joint-guide':
      'Joint guide 2008: Steel Buildings in Europe, Multi-Storey Steel Buildings, Part 5. Clauses 1-1, 1-5 and 1-8: parts of EN 1993.',
    'notch-in-buckling':
      'A beam that is not held against lateral-torsional buckling needs the notch in that check: it lowers the stiffness of the end.',
    'bolts-govern': 'The bolts give before plate and web bear: the end has little ductility.',
    'guide-spacing': 'The joint guide advises edge and end distances of 2 d and a pitch of 2.5 d; some are less here.',
    'tie-support': 'Under the tie force the support itself, its web in bending, is not checked.',
    'leg-weld-full': "The weld of a cleat's leg along the web is taken as full size to the ends of its returns.",
    'two-columns-ut':
      'U_t 0.3 for two bolt columns is from memory of the standard; for the plate it is taken as for the web, by judgement.',
    'three-columns-ut': 'For three bolt columns or more no value of U_t is published: 0.3, that of two, was used.',
    'grade-not-listed': 'The standard does not list {value}: its strengths are those of its own product standard.',
  },
};

const admit = (words: Words, { reasons, notes }: typeof further): void => {
  Object.assign(words.reasons, reasons);
  Object.assign(words.notes, notes);
};

admit(commonwealth, further);
admit(northAmerica, saidThere(further));

admitOptions({
  'plain-web': 'Shear area of a plain web',
  'tee-shear': 'Shear area of a tee',
  'long-joint': 'Long joints',
  execution: 'Execution class',
  reduced: 'nine tenths of it',
  amended: 'as amended',
  'first-print': 'as first printed',
  EXC1: 'class one',
  EXC2: 'class two',
  EXC3: 'class three',
  EXC4: 'class four',
  'cope-method': 'Method at the cut',
  'double-cope-arm': 'Arm where both edges are cut',
  'end-underrun': 'Beams cut short',
  'hole-deformation': 'Deformation of holes',
  'eccentric-bearing': 'Bearing of eccentric groups',
  'lap-torsion': 'Twist of the lap',
  current: 'present handbook',
  older: 'older handbook',
  longer: 'to the longer one',
  deducted: 'deducted from the end distance',
  'as-drawn': 'end distance as drawn',
  lowest: 'by the weakest bolt',
  sum: 'by the sum of the bolts',
  plastic: 'plastic',
  unified: 'over the gross length',
  net: 'over the net length',
  uniform: 'even tension',
  'non-uniform': 'uneven tension',
  machine: 'cut by machine',
  shop: 'made in the shop',
  site: 'made on site',
  SP: 'structural purpose',
  GP: 'general purpose',
});
