import { GradeField } from '../field/GradeField.tsx';
import { standard } from '../state/bench.ts';

const strengths = [
  { name: 'fy', label: 'Yield f_y' },
  { name: 'fu', label: 'Tensile f_u' },
] as const;

/** A steel by its grade in the standard, or by its strengths. */
export const SteelField = ({ path }: { readonly path: string }) => {
  const materials = standard.value?.materials;
  const plates = path.startsWith('joint.cleat') ? (materials?.cleats ?? materials?.plates) : materials?.plates;
  const steels = path.startsWith('joint.') ? plates : materials?.sections;
  return <GradeField path={path} label="Grade" names={steels?.grades ?? []} strengths={strengths} />;
};
