import { createContext, useCallback, useContext, useEffect, useState, type ReactNode } from "react";
import X from "lucide-react/icons/x";

type ToastMessage = { id: number; message: ReactNode; undo?: { label: string; act: () => void } | undefined };
type ShowToast = (message: ReactNode, undo?: { label: string; act: () => void }) => void;

const ShowToastContext = createContext<ShowToast>(() => undefined);

/** Gives `show(message, undo?)`: a short word at the foot of the screen about what was just done. */
export function useToast(): ShowToast {
  return useContext(ShowToastContext);
}

const shownForMs = 10_000;

/** Holds the last toast and reads it aloud; it leaves by itself, later when it can still be undone. */
export function ToastProvider({ children }: { children: ReactNode }) {
  const [toast, setToast] = useState<ToastMessage | null>(null);
  const show = useCallback<ShowToast>(
    (message, undo) => setToast((last) => ({ id: (last?.id ?? 0) + 1, message, undo })),
    [],
  );
  const close = useCallback(() => setToast(null), []);
  useEffect(() => {
    if (!toast) return;
    const timer = setTimeout(close, toast.undo ? shownForMs * 2 : shownForMs);
    return () => clearTimeout(timer);
  }, [toast, close]);
  return (
    <ShowToastContext value={show}>
      {children}
      <div
        aria-live="polite"
        className="pointer-events-none fixed inset-x-0 bottom-0 z-40 grid justify-items-center p-4 print:hidden"
      >
        {toast && <ToastCard key={toast.id} toast={toast} onClose={close} />}
      </div>
    </ShowToastContext>
  );
}

function ToastCard({ toast: { message, undo }, onClose }: { toast: ToastMessage; onClose: () => void }) {
  const undoIt = () => {
    undo?.act();
    onClose();
  };
  return (
    <div className="pointer-events-auto flex items-center gap-1 rounded-card bg-ink py-1 pr-1 pl-4 text-mist">
      <p className="py-2">{message}</p>
      {undo && (
        <button
          type="button"
          onClick={undoIt}
          className="min-h-touch rounded-full px-4 font-semibold underline underline-offset-4"
        >
          {undo.label}
        </button>
      )}
      <button type="button" onClick={onClose} className="grid size-touch place-items-center rounded-full">
        <X aria-hidden="true" />
        <span className="sr-only">Close this message</span>
      </button>
    </div>
  );
}
