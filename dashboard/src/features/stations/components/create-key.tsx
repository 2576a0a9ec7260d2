import { useState } from 'react';
import { Button } from '@/components/ui/button';
import type { CreatedApiKey } from '@/types/api';
import { KeyForm } from './key-form';
import { NewKey } from './new-key';

/** Makes a key and shows it once. */
export function CreateKey({ station }: { station: string }) {
  const [isOpen, setOpen] = useState(false);
  const [created, setCreated] = useState<CreatedApiKey | null>(null);

  const finish = (key: CreatedApiKey) => {
    setOpen(false);
    setCreated(key);
  };

  return (
    <>
      <Button onClick={() => setOpen(true)}>Create a key</Button>
      {isOpen && <KeyForm station={station} onClose={() => setOpen(false)} onCreated={finish} />}
      {created && <NewKey station={station} created={created} onClose={() => setCreated(null)} />}
    </>
  );
}
