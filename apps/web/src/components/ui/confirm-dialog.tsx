import type { ReactNode } from 'react';
import { Button } from './button.tsx';
import { Dialog } from './dialog.tsx';
import { DialogActions } from './dialog-actions.tsx';
import { Problem } from './problem.tsx';

export interface ConfirmDialogProps {
  open: boolean;
  onOpenChange: (open: boolean) => void;
  title: string;
  confirmLabel: string;
  kind?: 'primary' | 'danger' | undefined;
  busy?: boolean | undefined;
  /** Why the last try was refused. */
  error?: unknown;
  onConfirm: () => void;
  children: ReactNode;
}

/** Asks before what cannot be undone. The children say what happens, and to what. */
export function ConfirmDialog(props: ConfirmDialogProps) {
  const {
    open,
    onOpenChange,
    title,
    confirmLabel,
    kind = 'primary',
    busy,
    error,
    onConfirm,
    children,
  } = props;
  return (
    <Dialog open={open} onOpenChange={onOpenChange} title={title}>
      <div>{children}</div>
      {error !== undefined && error !== null && <Problem error={error} />}
      <DialogActions>
        <Button
          onClick={() => {
            onOpenChange(false);
          }}
        >
          Cancel
        </Button>
        <Button kind={kind} busy={busy} onClick={onConfirm}>
          {confirmLabel}
        </Button>
      </DialogActions>
    </Dialog>
  );
}
