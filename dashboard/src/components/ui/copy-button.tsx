import { useState } from 'react';
import { useToast } from '@/lib/toasts';
import { Button } from './button';

export interface CopyButtonProps {
  text: string;
  /** Names what is copied: "Copy key". */
  label: string;
  kind?: 'primary' | 'plain';
  size?: 'small' | 'default';
}

/** Copies a text and says that it did, on the button and to those who listen. */
export function CopyButton({ text, label, kind = 'plain', size = 'default' }: CopyButtonProps) {
  const [copied, setCopied] = useState<string | null>(null);
  const toast = useToast();

  const copy = async () => {
    try {
      await navigator.clipboard.writeText(text);
      setCopied(text);
    } catch {
      toast({
        kind: 'error',
        text: 'The browser does not let this page copy. Select the text and copy it by hand.',
      });
    }
  };

  return (
    <span role="status">
      <Button kind={kind} size={size} onClick={() => void copy()}>
        {copied === text ? 'Copied' : label}
      </Button>
    </span>
  );
}
