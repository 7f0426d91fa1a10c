import { signal } from '@preact/signals';

/** Something the bench has to tell beside the end itself: what was done, or why it was not. */
export interface Notice {
  readonly title: string;
  readonly lines?: readonly string[];
  /** A text to be copied by hand. */
  readonly copy?: string;
  readonly kind: 'done' | 'refused';
}

export const notice = signal<Notice | null>(null);

export const tell = (title: string): void => {
  notice.value = { title, kind: 'done' };
};

export const refuse = (title: string, lines: readonly string[] = []): void => {
  notice.value = { title, lines, kind: 'refused' };
};
