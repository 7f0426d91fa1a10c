export { BesideVerdict, verdictSaid } from './BesideVerdict.tsx';
export { pairedRungs } from './pairedRungs.ts';
export { RuleSizes } from './RuleSizes.tsx';
export { SecondLine } from './SecondLine.tsx';
export { SecondWorking } from './SecondWorking.tsx';
