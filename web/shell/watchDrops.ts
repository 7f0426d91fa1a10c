import { carried } from '../state/carried.ts';
import { page } from './address.ts';
import { fileOver } from './fileOver.ts';

const isTaken = (event: DragEvent): boolean =>
  page.value === 'bench' && (event.dataTransfer?.types.includes('Files') ?? false);

/** The whole bench takes a dropped file of an end, or its sheet. */
export const watchDrops = (): void => {
  document.addEventListener('dragover', (event) => {
    if (!isTaken(event)) return;
    event.preventDefault();
    fileOver.value = true;
  });
  document.addEventListener('dragleave', (event) => {
    if (event.relatedTarget === null) fileOver.value = false;
  });
  document.addEventListener('drop', (event) => {
    if (!isTaken(event)) return;
    event.preventDefault();
    fileOver.value = false;
    const file = event.dataTransfer?.files[0];
    if (file) void carried(({ openFile }) => openFile(file));
  });
};
