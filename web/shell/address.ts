import { signal } from '@preact/signals';

/** What is shown: the bench, its shop card, a standard in full (at one of its checks where `rule` names it), or the proof. */
type Page = 'bench' | 'card' | 'proof' | { readonly standard: string; readonly rule: string };

export const page = signal<Page>('bench');

const STANDARD = '#standard=';
export const CARD = '#card';
export const PROOF = '#proof';

/** Address of a standard's page, or of one of its checks. */
export const standardAddress = (id: string, rule = ''): string =>
  `${STANDARD}${encodeURIComponent(id)}${rule && `/${encodeURIComponent(rule)}`}`;

const unescaped = (text: string): string => {
  try {
    return decodeURIComponent(text);
  } catch {
    return text;
  }
};

const pageAt = (hash: string): Page => {
  if (hash === CARD) return 'card';
  if (hash === PROOF) return 'proof';
  if (!hash.startsWith(STANDARD)) return 'bench';
  const [standard = '', rule = ''] = hash.slice(STANDARD.length).split('/').map(unescaped);
  return { standard, rule };
};

/** Shows what the address asks for. */
export const followAddress = (): void => {
  page.value = pageAt(location.hash);
};
