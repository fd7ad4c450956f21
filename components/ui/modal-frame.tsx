import { type MouseEvent, type PropsWithChildren, type SyntheticEvent, useEffect, useRef } from 'react';

export interface ModalFrameProps {
  open: boolean;
  label: string;
  onClose: () => void;
  /** Where it stands and how it moves: a class of the page's own style sheet. */
  place: 'dialog' | 'sheet';
}

/** The browser's own modal: it keeps the focus inside, gives it back at the end, closes on Escape and makes the page behind it inert. */
export function ModalFrame({ open, label, onClose, place, children }: PropsWithChildren<ModalFrameProps>) {
  const dialog = useRef<HTMLDialogElement>(null);
  useEffect(() => {
    if (open && !dialog.current?.open) dialog.current?.showModal();
    if (!open && dialog.current?.open) dialog.current.close();
  }, [open]);
  const cancel = (event: SyntheticEvent) => {
    event.preventDefault();
    onClose();
  };
  const closeOutside = (event: MouseEvent) => {
    if (event.target === dialog.current) onClose();
  };
  return (
    <dialog ref={dialog} className={`kerbline-${place}`} aria-label={label} onCancel={cancel} onClick={closeOutside}>
      {open ? children : null}
    </dialog>
  );
}
