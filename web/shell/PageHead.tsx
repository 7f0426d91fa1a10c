/// <reference types="vite/client" />
import styles from '../style/pages.css?url';
import { Pages } from './Pages.tsx';

/** Head of a page beside the bench, with the styles that only such pages need. */
export const PageHead = () => (
  <>
    <link rel="stylesheet" href={styles} />
    <header class="top-band">
      <b class="brand">Copewright</b>
      <Pages />
    </header>
  </>
);
