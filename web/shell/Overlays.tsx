import { Confirm } from './Confirm.tsx';
import { DropPlace } from './DropPlace.tsx';
import { FieldFinder } from './FieldFinder.tsx';
import { Keys } from './Keys.tsx';

/** What comes over the bench: dialogs, and the place where a file may be dropped. */
export const Overlays = () => (
  <>
    <FieldFinder />
    <Keys />
    <Confirm />
    <DropPlace />
  </>
);
