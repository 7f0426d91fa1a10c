import { Confirm } from './Confirm.tsx';
import { FieldFinder } from './FieldFinder.tsx';
import { Keys } from './Keys.tsx';

/** The dialogs over the bench. */
export const Dialogs = () => (
  <>
    <FieldFinder />
    <Keys />
    <Confirm />
  </>
);
