import { type ReactNode, useEffect, useId, useRef } from 'react';

interface Props {
  title: string;
  onClose: () => void;
  children: ReactNode;
}

/** A modal panel that was asked for. Escape closes it, and focus goes back to where it was. */
export const Dialog = ({ title, onClose, children }: Props) => {
  const dialog = useRef<HTMLDialogElement>(null);
  const titleId = useId();

  useEffect(() => {
    const before = document.activeElement;
    dialog.current?.showModal();
    // What the panel asks for comes before its way out.
    dialog.current?.querySelector<HTMLElement>('[data-first]')?.focus();
    return () => {
      if (before instanceof HTMLElement) before.focus();
    };
  }, []);

  return (
    <dialog ref={dialog} className="case-dialog" aria-labelledby={titleId} onClose={onClose}>
      <div className="mb-3 flex items-baseline justify-between gap-4">
        <h2 id={titleId}>{title}</h2>
        <button type="button" className="case-link" onClick={onClose}>
          Close <kbd className="key">Esc</kbd>
        </button>
      </div>
      {children}
    </dialog>
  );
};
