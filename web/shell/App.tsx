import { laterPart } from '../style/laterPart.ts';
import { page } from './address.ts';
import { Bench } from './Bench.tsx';

const standardsPage = laterPart(async () => (await import('../standards/StandardsPage.tsx')).StandardsPage);
const cardPage = laterPart(async () => (await import('../card/CardPage.tsx')).CardPage);
const proofPage = laterPart(async () => (await import('../proof/ProofPage.tsx')).ProofPage);

const coming = <p role="status">The page is on its way.</p>;

/** The page that the address asks for. */
export const App = () => {
  const open = page.value;
  if (open === 'bench') return <Bench />;
  if (typeof open === 'string') {
    const Page = (open === 'card' ? cardPage : proofPage).value;
    return Page ? <Page /> : coming;
  }
  const Standards = standardsPage.value;
  return Standards ? <Standards id={open.standard} rule={open.rule} /> : coming;
};
