export { Footing } from './Footing.tsx';
export { Ladder } from './Ladder.tsx';
export { Verdict } from './Verdict.tsx';
export { VerdictStrip } from './VerdictStrip.tsx';
