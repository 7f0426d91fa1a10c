import type { Signal } from '@preact/signals';
import type { ComponentChildren } from 'preact';
import { useEffect, useRef } from 'preact/hooks';

interface DialogProps {
  readonly shown: Signal<boolean>;
  readonly title: string;
  readonly children: ComponentChildren;
}

/** A dialog over the bench; Escape and its button close it, and focus goes back to where it was. */
export const Dialog = ({ shown, title, children }: DialogProps) => {
  const dialog = useRef<HTMLDialogElement>(null);
  const open = shown.value;
  useEffect(() => {
    if (open) dialog.current?.showModal();
  }, [open]);
  if (!open) return null;
  return (
    <dialog
      ref={dialog}
      class="dialog"
      aria-labelledby="dialog-title"
      onClose={() => {
        shown.value = false;
      }}
    >
      <h2 id="dialog-title">{title}</h2>
      {children}
      <button type="button" class="button" onClick={() => dialog.current?.close()}>
        Close
      </button>
    </dialog>
  );
};
