import { useState } from 'react';
import { useNavigate } from 'react-router-dom';
import { Button } from '@/components/ui/button';
import { FormDialog } from '@/components/ui/form-dialog';
import { TextField } from '@/components/ui/text-field';
import { paths } from '@/config/paths';
import { fieldFault } from '@/lib/field-fault';
import { useCreateStation } from '../api/create-station';

/** Adds a station and goes to its page, where it gets its first key. */
export function AddStation() {
  const [isOpen, setOpen] = useState(false);
  return (
    <>
      <Button kind="primary" onClick={() => setOpen(true)}>
        Add a station
      </Button>
      {isOpen && <StationForm onClose={() => setOpen(false)} />}
    </>
  );
}

function StationForm({ onClose }: { onClose: () => void }) {
  const [station, setStation] = useState('');
  const [line, setLine] = useState('');
  const create = useCreateStation();
  const navigate = useNavigate();

  const submit = () =>
    create.mutate(
      { body: { station: station.trim(), line: line.trim() } },
      { onSuccess: (created) => void navigate(paths.station(created.station)) },
    );

  return (
    <FormDialog
      title="Add a station"
      actionLabel="Add station"
      onClose={onClose}
      onSubmit={submit}
      isBusy={create.isPending}
      error={create.error}
      fields={['/station', '/line']}
    >
      <TextField
        label="Name"
        value={station}
        onChange={setStation}
        placeholder="south-3"
        hint="Small letters, digits and hyphens. Results carry it for ever, so it never changes."
        error={fieldFault(create.error, '/station')}
        isRequired
        hasFocus
      />
      <TextField
        label="Line"
        value={line}
        onChange={setLine}
        placeholder="south"
        error={fieldFault(create.error, '/line')}
        isRequired
      />
    </FormDialog>
  );
}
