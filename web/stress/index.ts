export { Stress } from './Stress.tsx';
