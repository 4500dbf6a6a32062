import type { ReactNode } from "react";
import { Button } from "./Button.tsx";
import { Dialog } from "./Dialog.tsx";

type Props = {
  open: boolean;
  onClose: () => void;
  onConfirm: () => void;
  title: ReactNode;
  /** What will happen, in a sentence. */
  children?: ReactNode;
  /** The verb on the button: "Cancel my order", never "OK". */
  confirmLabel: string;
  cancelLabel?: string | undefined;
  pending?: string | false | undefined;
  danger?: boolean | undefined;
};

/** Asks before a verb that is hard to take back. */
export function ConfirmDialog({
  open,
  onClose,
  onConfirm,
  title,
  children,
  confirmLabel,
  cancelLabel = "Keep it as it is",
  pending,
  danger,
}: Props) {
  return (
    <Dialog open={open} onClose={onClose} title={title}>
      {children && <div className="text-ink-2">{children}</div>}
      <div className="mt-5 flex flex-wrap gap-3">
        <Button variant={danger ? "danger" : "primary"} pending={pending} onClick={onConfirm}>
          {confirmLabel}
        </Button>
        <Button variant="quiet" onClick={onClose}>
          {cancelLabel}
        </Button>
      </div>
    </Dialog>
  );
}
