import { ActionIcon, Button } from '@mantine/core';
import { IconX } from '@tabler/icons-react';
import { useEffect, useState } from 'react';
import { useWords } from '../hooks/use-words';
import type { Toast } from '../lib/toasts';
import { ACTION_MILLISECONDS, dismissToast, MESSAGE_MILLISECONDS, useToasts } from '../lib/toasts';
import classes from './toaster.module.css';

/** Messages that come and go; `role=status` says them without moving the focus. */
export function Toaster() {
  const toasts = useToasts((state) => state.toasts);
  return (
    <div className={classes.stack} role="status" aria-live="polite">
      {toasts.map((toast) => (
        <ToastCard key={toast.id} toast={toast} />
      ))}
    </div>
  );
}

function ToastCard({ toast }: { toast: Toast }) {
  const { say } = useWords();
  const [held, setHeld] = useState(false);
  const milliseconds = toast.action ? ACTION_MILLISECONDS : MESSAGE_MILLISECONDS;

  useEffect(() => {
    if (held) return;
    const timer = setTimeout(() => dismissToast(toast.id), milliseconds);
    return () => clearTimeout(timer);
  }, [held, milliseconds, toast.id]);

  return (
    <div
      className={classes.toast}
      onMouseEnter={() => setHeld(true)}
      onMouseLeave={() => setHeld(false)}
      onFocus={() => setHeld(true)}
      onBlur={() => setHeld(false)}
    >
      <span className={classes.message}>{toast.message}</span>
      {toast.action && (
        <Button
          onClick={() => {
            toast.action?.run();
            dismissToast(toast.id);
          }}
        >
          {toast.action.label}
        </Button>
      )}
      <ActionIcon aria-label={say('app.close')} onClick={() => dismissToast(toast.id)}>
        <IconX size={18} />
      </ActionIcon>
    </div>
  );
}
