import { signal } from '@preact/signals';

const PLACE = 'copewright.keys';

const keptSwitch = (): boolean => {
  try {
    return localStorage.getItem(PLACE) !== 'off';
  } catch {
    return true;
  }
};

/** Keys of a single letter work while no field has focus; people who dictate may switch them off. */
export const singleKeys = signal(keptSwitch());

export const setSingleKeys = (on: boolean): void => {
  singleKeys.value = on;
  try {
    localStorage.setItem(PLACE, on ? 'on' : 'off');
  } catch {
    // Without storage the choice holds for this visit.
  }
};
