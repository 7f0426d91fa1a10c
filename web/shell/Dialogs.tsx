import { Confirm } from './Confirm.tsx';
import { DropPlace } from './DropPlace.tsx';
import { FieldFinder } from './FieldFinder.tsx';
import { Keys } from './Keys.tsx';

/** The dialogs over the bench, and what says that it takes a file. */
export const Dialogs = () => (
  <>
    <FieldFinder />
    <Keys />
    <Confirm />
    <DropPlace />
  </>
);
