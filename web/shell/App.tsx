import { read } from '../standards/openStandard.ts';
import { later } from '../state/later.ts';
import { Bench } from './Bench.tsx';

const standardsPage = later(async () => (await import('../standards/StandardsPage.tsx')).StandardsPage);

/** The page that the address asks for. */
export const App = () => {
  const open = read.value;
  if (!open) return <Bench />;
  const Page = standardsPage.value;
  return Page ? <Page {...open} /> : <p role="status">The page is on its way.</p>;
};
