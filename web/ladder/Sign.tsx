import type { Mark } from './standing.ts';

interface Props {
  readonly mark: Mark | null;
  /** px */
  readonly size?: number;
}

const drawn: Readonly<Record<Mark, preact.JSX.Element>> = {
  holds: <circle cx="6" cy="6" r="4.75" />,
  close: (
    <>
      <circle cx="6" cy="6" r="4.75" />
      <path class="solid" d="M6 1.25a4.75 4.75 0 0 0 0 9.5z" />
    </>
  ),
  fails: <rect class="solid" x="1" y="1" width="10" height="10" />,
  refer: <circle cx="6" cy="6" r="4.75" stroke-dasharray="2.2 1.53" />,
  incomplete: <path d="M1 10.5h10" stroke-dasharray="1.5 1.67" />,
};

/** The drawn sign of a state: hollow circle, half-filled circle, solid square, dashed circle, dotted line. The word stands beside it. */
export const Sign = ({ mark, size = 11 }: Props) =>
  mark === null ? (
    <span class="sign" />
  ) : (
    <svg class="sign" width={size} height={size} viewBox="0 0 12 12" aria-hidden="true">
      {drawn[mark]}
    </svg>
  );
