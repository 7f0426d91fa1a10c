export { CopeProposal } from './CopeProposal.tsx';
export { takeProposal } from './takeProposal.ts';
