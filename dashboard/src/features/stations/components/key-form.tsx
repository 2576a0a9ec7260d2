import { DateTime } from 'luxon';
import { useState } from 'react';
import { CheckField } from '@/components/ui/check-field';
import { DateField } from '@/components/ui/date-field';
import { FormDialog } from '@/components/ui/form-dialog';
import { TextField } from '@/components/ui/text-field';
import { fieldFault } from '@/lib/field-fault';
import { useSite } from '@/lib/site';
import type { CreatedApiKey } from '@/types/api';
import { useCreateKey } from '../api/create-key';

export interface KeyFormProps {
  station: string;
  onClose: () => void;
  onCreated: (key: CreatedApiKey) => void;
}

/** A chosen day is the last on which the key works, by the site's clock. */
function endOfDay(day: string, timeZone: string): string | null {
  return day === '' ? null : DateTime.fromISO(day, { zone: timeZone }).endOf('day').toUTC().toISO();
}

export function KeyForm({ station, onClose, onCreated }: KeyFormProps) {
  const { timeZone } = useSite();
  const [label, setLabel] = useState('');
  const [isPractice, setPractice] = useState(false);
  const [lastDay, setLastDay] = useState('');
  const create = useCreateKey(station);

  const submit = () =>
    create.mutate(
      {
        params: { path: { station } },
        body: { label: label.trim(), practice: isPractice, expiresAt: endOfDay(lastDay, timeZone) },
      },
      { onSuccess: onCreated },
    );

  return (
    <FormDialog
      title={`Create a key for ${station}`}
      actionLabel="Create key"
      onClose={onClose}
      onSubmit={submit}
      isBusy={create.isPending}
      error={create.error}
      fields={['/label', '/expiresAt']}
    >
      <TextField
        label="Label"
        value={label}
        onChange={setLabel}
        placeholder="rack PC, bay 2"
        hint="Where the key will live, so that it can be told from the others later."
        error={fieldFault(create.error, '/label')}
        isRequired
        hasFocus
      />
      <DateField
        label="Last day"
        value={lastDay}
        onChange={setLastDay}
        min={DateTime.now().setZone(timeZone).toISODate() ?? ''}
        hint="Left empty, the key works until it is revoked."
        error={fieldFault(create.error, '/expiresAt')}
      />
      <CheckField
        label="Practice key"
        isChecked={isPractice}
        onChange={setPractice}
        hint="Its results are judged and shown, but count in no yield and open no breach."
      />
    </FormDialog>
  );
}
