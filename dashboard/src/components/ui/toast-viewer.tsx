import Toast from '@douyinfe/semi-ui/lib/es/toast';
import { useEffect, useRef, type ReactElement } from 'react';
import type { ToastMessage } from '@/lib/toasts';
import styles from './toast-viewer.module.css';

const SECONDS = 5;

type ToastApi = Record<ToastMessage['kind'], (config: { content: string; duration: number }) => string>;

/** Hands each new message to the library's toasts once. */
export function ToastViewer({ messages }: { messages: ToastMessage[] }) {
  // The library types this pair as an array of either.
  const [toast, holder] = Toast.useToast() as unknown as [ToastApi, ReactElement];
  const shown = useRef(0);

  useEffect(() => {
    for (const { kind, text } of messages.slice(shown.current)) {
      toast[kind]({ content: text, duration: SECONDS });
    }
    shown.current = messages.length;
  }, [messages, toast]);

  return <div className={styles.viewer}>{holder}</div>;
}
