import { signal } from '@preact/signals';

/** The standard that is read on its own page, and the check at which it opens; null while the bench is shown. */
export const read = signal<{ readonly id: string; readonly rule: string } | null>(null);

const PREFIX = '#standard=';

/** Address of a standard's page, or of one of its checks. */
export const standardAddress = (id: string, rule = ''): string =>
  `${PREFIX}${encodeURIComponent(id)}${rule && `/${encodeURIComponent(rule)}`}`;

/** Follows the address: to the page of a standard, or back to the bench. */
export const followAddress = (): void => {
  const { hash } = location;
  if (!hash.startsWith(PREFIX)) {
    read.value = null;
    return;
  }
  const [id = '', rule = ''] = hash.slice(PREFIX.length).split('/').map(unescaped);
  read.value = { id, rule };
};

const unescaped = (text: string): string => {
  try {
    return decodeURIComponent(text);
  } catch {
    return text;
  }
};
