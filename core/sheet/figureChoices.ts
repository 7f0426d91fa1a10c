import type { Figures } from './figure.ts';

/** How the shear stress is shown: profiles, or numbers where these leave no room. */
export type Showing = 'profiles' | 'numbers';

/** One way to share the upper part of the sheet. */
export interface Choice {
  readonly showing: Showing;
  readonly scale: number;
  readonly labelled: boolean;
}

/** Every choice: a large figure matters more than profiles, these more than words that the data repeat. */
export const choices = ({ scales: all }: Figures): Choice[] => {
  const [large, small] = [all.slice(0, 2), all.slice(2)];
  return [large, small].flatMap((scales) =>
    (['profiles', 'numbers'] as const).flatMap((showing) =>
      scales.flatMap((scale) => [true, false].map((labelled) => ({ showing, scale, labelled }))),
    ),
  );
};
