import type { Facts } from '../../end/facts.ts';

/** Whether a leg or an end plate lies on the support's face; a plate on edge or a web bolted to a ply has nothing there. */
export const liesOnSupport = ({ bp, legSupport }: Facts): boolean => bp > 0 || legSupport > 0;
