import { laterPart } from '../style/laterPart.ts';
import type { WorkingProps } from './Working.tsx';

const part = laterPart(async () => (await import('./Working.tsx')).Working);

/** The working of a rung that is open; its writer is no part of the first view. */
export const OpenWorking = (props: WorkingProps) => {
  const Working = part.value;
  return Working && <Working {...props} />;
};
