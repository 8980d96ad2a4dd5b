import { type ReactNode, useEffect, useId, useRef } from "react";

type Props = { open: boolean; onClose: () => void; title: string; children: ReactNode };

/** A modal question. The browser's own dialog: focus goes in, stays in, and goes back; Escape closes. */
export function Dialog({ open, onClose, title, children }: Props) {
  const dialog = useRef<HTMLDialogElement>(null);
  const titleId = useId();
  useEffect(() => {
    const element = dialog.current;
    if (open && element && !element.open) element.showModal();
    if (!open && element?.open) element.close();
  }, [open]);

  return (
    <dialog ref={dialog} aria-labelledby={titleId} onClose={onClose}>
      {open && (
        <div className="grid gap-4">
          <h2 id={titleId} className="text-step2">
            {title}
          </h2>
          {children}
        </div>
      )}
    </dialog>
  );
}
