import { useEffect, useId, useRef, type MouseEvent, type ReactNode } from 'react';
import { X } from 'lucide-react';
import { IconButton } from './button';

interface Props {
  open: boolean;
  title: string;
  /** Asked for by Esc, a press beside the dialog or its cross. */
  onClose: () => void;
  /** The name of the cross; without it the children hold the way out. */
  closeLabel?: string;
  /** For pictures. */
  wide?: boolean;
  children: ReactNode;
}

/** The browser's own modal dialog: keeps focus inside and gives it back where it was. */
export function Dialog({ open, title, onClose, closeLabel, wide = false, children }: Props) {
  const box = useRef<HTMLDialogElement>(null);
  const heading = useId();

  useEffect(() => {
    const dialog = box.current;
    if (!open || !dialog) return;
    const before = document.activeElement;
    dialog.showModal();
    return () => {
      dialog.close();
      if (before instanceof HTMLElement) before.focus();
    };
  }, [open]);

  // On the press, not the click: a selection dragged out of a text box ends beside the dialog too.
  const beside = (event: MouseEvent) => {
    if (event.target !== box.current) return;
    event.preventDefault();
    onClose();
  };
  return (
    <dialog
      ref={box}
      aria-labelledby={heading}
      onMouseDown={beside}
      onCancel={(event) => {
        event.preventDefault();
        onClose();
      }}
      className={`m-auto w-[calc(100%-2rem)] rounded-card border border-rule bg-surface p-0 text-ink shadow-lg backdrop:bg-[rgb(8_14_18/0.55)] ${wide ? 'max-w-4xl' : 'max-w-md'}`}
    >
      {open && (
        <div className="p-5">
          <div className="mb-3 flex items-start justify-between gap-3">
            <h2 id={heading} className="text-lead font-bold">
              {title}
            </h2>
            {closeLabel && (
              <span className="-mt-2.5 -mr-2.5">
                <IconButton label={closeLabel} icon={<X aria-hidden size={20} />} onClick={onClose} />
              </span>
            )}
          </div>
          {children}
        </div>
      )}
    </dialog>
  );
}
