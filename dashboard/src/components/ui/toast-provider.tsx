import { lazy, Suspense, useCallback, useState, type ReactNode } from 'react';
import { ToastContext, type ToastMessage } from '@/lib/toasts';

// The library's toasts stay out of the first paint: they are fetched with the first message.
const ToastViewer = lazy(async () => ({ default: (await import('./toast-viewer')).ToastViewer }));

export function ToastProvider({ children }: { children: ReactNode }) {
  const [messages, setMessages] = useState<ToastMessage[]>([]);
  const show = useCallback((message: ToastMessage) => setMessages((earlier) => [...earlier, message]), []);
  return (
    <ToastContext.Provider value={show}>
      {children}
      {messages.length > 0 && (
        <Suspense>
          <ToastViewer messages={messages} />
        </Suspense>
      )}
    </ToastContext.Provider>
  );
}
