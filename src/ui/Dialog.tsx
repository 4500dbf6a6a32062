import { useEffect, useId, useRef, type ReactNode } from "react";
import X from "lucide-react/icons/x";

type Props = {
  open: boolean;
  /** Called on Esc, on the close button, and on a press outside. */
  onClose: () => void;
  title: ReactNode;
  children: ReactNode;
};

/** A modal on the native <dialog>: focus goes in, Esc closes, focus comes back where it was. */
export function Dialog({ open, onClose, title, children }: Props) {
  const box = useRef<HTMLDialogElement>(null);
  const titleId = useId();
  useEffect(() => {
    const dialog = box.current;
    if (!dialog) return;
    if (open && !dialog.open) dialog.showModal();
    if (!open && dialog.open) dialog.close();
  }, [open]);
  return (
    <dialog
      ref={box}
      aria-labelledby={titleId}
      onClose={onClose}
      onClick={(event) => event.target === box.current && onClose()}
      className="m-auto w-[min(34rem,calc(100vw-2rem))] max-h-[calc(100dvh-2rem)] rounded-card bg-float text-ink max-md:mb-4"
    >
      <div className="p-5 md:p-6">
        <div className="mb-3 flex items-start justify-between gap-4">
          <h2 id={titleId} className="text-title">
            {title}
          </h2>
          <button
            type="button"
            onClick={onClose}
            className="-mt-2.5 -mr-2.5 grid size-touch shrink-0 place-items-center rounded-full text-ink-2 hover:bg-water"
          >
            <X aria-hidden="true" />
            <span className="sr-only">Close</span>
          </button>
        </div>
        {open && children}
      </div>
    </dialog>
  );
}
