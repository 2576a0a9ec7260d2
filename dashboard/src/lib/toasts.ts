import { createContext, useContext } from 'react';

export interface ToastMessage {
  kind: 'success' | 'error' | 'info';
  text: string;
}

export const ToastContext = createContext<(message: ToastMessage) => void>(() => {
  throw new Error('useToast needs the ToastProvider.');
});

/** Says the outcome of an act in a passing note: `toast({ kind: 'success', text: 'Key revoked' })`. */
export const useToast = () => useContext(ToastContext);
