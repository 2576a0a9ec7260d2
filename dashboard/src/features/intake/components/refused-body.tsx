import { useMemo, useState } from 'react';
import { Button } from '@/components/ui/button';
import { CopyButton } from '@/components/ui/copy-button';
import { Section } from '@/components/ui/section';
import type { RefusedPost } from '@/types/api';
import { findPlaces } from '../find-places';
import { isHardToRead, layOut } from '../lay-out';
import { markLines } from '../marked-lines';
import { PostedBody } from './posted-body';
import { ReasonList } from './reason-list';

/** The reasons, and the body they point into: as received or set out in lines. */
export function RefusedBody({
  post: { body, bodyBytes, bodyTruncated, errors, detail },
}: {
  post: RefusedPost;
}) {
  const [isLaidOut, setLaidOut] = useState(isHardToRead(body));
  const text = useMemo(() => (isLaidOut ? layOut(body) : body), [isLaidOut, body]);
  const places = useMemo(() => findPlaces(text, errors), [text, errors]);
  const lines = useMemo(() => markLines(text, places), [text, places]);
  const size = `${new Intl.NumberFormat('en-GB').format(bodyBytes)} bytes`;
  return (
    <>
      <Section title="Why it was refused">
        {errors.length > 0 ? (
          <ReasonList errors={errors} placed={new Set(places.map(({ reason }) => reason))} />
        ) : (
          <p>{detail}</p>
        )}
      </Section>
      <Section
        title={isLaidOut ? 'The body, set out in lines' : 'The body as received'}
        note={bodyTruncated ? `the beginning of ${size}; the rest was not kept` : size}
        actions={
          <>
            <Button size="small" onClick={() => setLaidOut(!isLaidOut)}>
              {isLaidOut ? 'Show as received' : 'Set out in lines'}
            </Button>
            <CopyButton size="small" label="Copy body" text={body} />
          </>
        }
      >
        <PostedBody lines={lines} errors={errors} />
      </Section>
    </>
  );
}
