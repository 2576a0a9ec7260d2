import Modal from '@douyinfe/semi-ui/lib/es/modal';
import type { ReactNode } from 'react';
import { Button } from './button';
import styles from './dialog.module.css';

export interface DialogProps {
  title: string;
  isOpen: boolean;
  onClose: () => void;
  children: ReactNode;
  /** The act of the dialog; left out for one that only shows something. */
  action?: { label: string; onAct: () => void; isDanger?: boolean; isBusy?: boolean; isDisabled?: boolean };
  closeLabel?: string;
}

/** A modal sheet that keeps the focus inside, closes by Escape and gives the focus back. */
export function Dialog({ title, isOpen, onClose, children, action, closeLabel }: DialogProps) {
  return (
    <Modal
      title={title}
      visible={isOpen}
      onCancel={onClose}
      closable={false}
      maskClosable={!action}
      width={520}
      centered
      footer={
        <div className={styles.footer}>
          <Button onClick={onClose}>{closeLabel ?? (action ? 'Cancel' : 'Close')}</Button>
          {action && (
            <Button
              kind={action.isDanger ? 'danger' : 'primary'}
              onClick={action.onAct}
              isBusy={action.isBusy ?? false}
              isDisabled={action.isDisabled ?? false}
            >
              {action.label}
            </Button>
          )}
        </div>
      }
    >
      {children}
    </Modal>
  );
}
