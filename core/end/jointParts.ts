import type { GradeGiven, Joint, SupportBolts, WebBolts } from './schema.ts';

/** The plate, ply or cleat of a joint, in the file's own units, whatever the joint calls it. */
export interface Fitting {
  /** Where it stands in the JSON, such as `joint.plate`. */
  readonly path: string;
  readonly thickness: number;
  readonly grade: GradeGiven;
}

/** The weld of a joint, and what it runs along. */
export interface JointWeld {
  readonly path: string;
  readonly to: 'support' | 'web';
  readonly leg: number;
  readonly electrode?: number | undefined;
}

/** Bolts through the beam's web with their place; undefined where the web is welded. */
export interface PlacedBolts {
  readonly bolts: WebBolts;
  readonly firstRow: number;
  readonly endDistance: number;
}

export const fittingOf = (joint: Joint): Fitting => {
  switch (joint.kind) {
    case 'fin-plate':
    case 'end-plate':
    case 'full-end-plate':
      return { path: 'joint.plate', thickness: joint.plate.thickness, grade: joint.plate.grade };
    case 'web-bolts':
      return { path: 'joint.ply', thickness: joint.ply.thickness, grade: joint.ply.grade };
    case 'double-cleat':
    case 'single-cleat':
      return { path: 'joint.cleat', thickness: joint.cleat.thickness, grade: joint.cleat.grade };
  }
};

export const webBoltsOf = (joint: Joint): PlacedBolts | undefined => {
  if (!('bolts' in joint) || joint.bolts === undefined) return undefined;
  return { bolts: joint.bolts, firstRow: joint.firstRow ?? 0, endDistance: joint.endDistance ?? 0 };
};

export const supportBoltsOf = (joint: Joint): SupportBolts | undefined =>
  'supportBolts' in joint ? joint.supportBolts : undefined;

export const weldOf = (joint: Joint): JointWeld | undefined => {
  switch (joint.kind) {
    case 'fin-plate':
      return { path: 'joint.weld', to: 'support', leg: joint.weld.leg, electrode: joint.weld.electrode };
    case 'end-plate':
    case 'full-end-plate':
      return { path: 'joint.webWeld', to: 'web', ...joint.webWeld };
    case 'double-cleat':
    case 'single-cleat': {
      const { webWeld, supportWeld } = joint.cleat;
      if (webWeld) return { path: 'joint.cleat.webWeld', to: 'web', ...webWeld };
      return supportWeld && { path: 'joint.cleat.supportWeld', to: 'support', ...supportWeld };
    }
    case 'web-bolts':
      return undefined;
  }
};

/** Angles beside the web, and shear planes of its bolts. */
export const cleatsIn = (joint: Joint): 1 | 2 => (joint.kind === 'double-cleat' ? 2 : 1);
