import { useSignal } from '@preact/signals';
import { useEffect } from 'preact/hooks';
import { carried } from '../state/carried.ts';

const hasFile = (event: DragEvent): boolean => event.dataTransfer?.types.includes('Files') ?? false;

/** The whole page takes a dropped file of an end, or its sheet. */
export const DropPlace = () => {
  const over = useSignal(false);
  useEffect(() => {
    const onOver = (event: DragEvent) => {
      if (!hasFile(event)) return;
      event.preventDefault();
      over.value = true;
    };
    const onLeave = (event: DragEvent) => {
      if (event.relatedTarget === null) over.value = false;
    };
    const onDrop = (event: DragEvent) => {
      if (!hasFile(event)) return;
      event.preventDefault();
      over.value = false;
      const file = event.dataTransfer?.files[0];
      if (file) void carried(({ openFile }) => openFile(file));
    };
    document.addEventListener('dragover', onOver);
    document.addEventListener('dragleave', onLeave);
    document.addEventListener('drop', onDrop);
    return () => {
      document.removeEventListener('dragover', onOver);
      document.removeEventListener('dragleave', onLeave);
      document.removeEventListener('drop', onDrop);
    };
  }, [over]);
  if (!over.value) return null;
  return (
    <div class="drop-place" aria-hidden="true">
      <p>Drop the file of an end, or its sheet, to open it</p>
    </div>
  );
};
