import { fileOver } from './fileOver.ts';

/** Says that the page takes the file that is held over it. */
export const DropPlace = () =>
  fileOver.value ? (
    <div class="drop-place" aria-hidden="true">
      <p>Drop the file of an end, or its sheet, to open it</p>
    </div>
  ) : null;
