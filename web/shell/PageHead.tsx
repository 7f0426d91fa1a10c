import { Pages } from './Pages.tsx';

/** Head of a page beside the bench. */
export const PageHead = () => (
  <header class="top-band">
    <b class="brand">Copewright</b>
    <Pages />
  </header>
);
