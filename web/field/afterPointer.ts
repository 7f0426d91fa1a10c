let down = false;
let waiting: (() => void)[] = [];

const up = (): void => {
  down = false;
  const due = waiting;
  waiting = [];
  // The click that ends the press comes first.
  setTimeout(() => {
    for (const act of due) act();
  });
};

/** Watches whether a pointer is pressed. */
export const watchPointer = (): void => {
  document.addEventListener('pointerdown', () => {
    down = true;
  });
  document.addEventListener('pointerup', up);
  document.addEventListener('pointercancel', up);
};

/**
 * Does something at once, or once the pointer that is pressed lets go: what appears under a field that is left must not push away the button
 * that is being pressed.
 */
export const afterPointer = (act: () => void): void => {
  if (down) waiting.push(act);
  else act();
};
