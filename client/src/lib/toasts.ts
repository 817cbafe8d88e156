import { create } from 'zustand';
import { newId } from './ids';

export interface ToastAction {
  label: string;
  run: () => void;
}

export interface Toast {
  id: string;
  message: string;
  action?: ToastAction;
}

/** An undo must stay in reach for ten seconds at least; a plain message is gone sooner. */
export const ACTION_MILLISECONDS = 12_000;
export const MESSAGE_MILLISECONDS = 6_000;
const MOST = 3;

export const useToasts = create<{ toasts: Toast[] }>(() => ({ toasts: [] }));

export function showToast(message: string, action?: ToastAction): string {
  const toast: Toast = { id: newId(), message, action };
  useToasts.setState(({ toasts }) => ({ toasts: [...toasts, toast].slice(-MOST) }));
  return toast.id;
}

export function dismissToast(id: string): void {
  useToasts.setState(({ toasts }) => ({ toasts: toasts.filter((toast) => toast.id !== id) }));
}

export function clearToasts(): void {
  useToasts.setState({ toasts: [] });
}
