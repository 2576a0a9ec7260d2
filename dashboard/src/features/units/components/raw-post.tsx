import { useQuery } from '@tanstack/react-query';
import { useState } from 'react';
import { Button } from '@/components/ui/button';
import { ErrorState } from '@/components/ui/error-state';
import { Loading } from '@/components/ui/loading';
import { Section } from '@/components/ui/section';
import { rawPostOptions } from '../api/get-raw-post';
import styles from './raw-post.module.css';

/** The post exactly as it was received, fetched when somebody asks for it. */
export function RawPost({ resultId }: { resultId: string }) {
  const [isOpen, setOpen] = useState(false);
  return (
    <Section
      title="Raw post"
      note="the bytes the station sent, unchanged"
      actions={
        <Button size="small" onClick={() => setOpen(!isOpen)} aria-expanded={isOpen}>
          {isOpen ? 'Hide the post' : 'Show the post'}
        </Button>
      }
    >
      {isOpen && <PostText resultId={resultId} />}
    </Section>
  );
}

function PostText({ resultId }: { resultId: string }) {
  const { data, error, refetch } = useQuery(rawPostOptions(resultId));
  if (error) return <ErrorState error={error} onRetry={() => void refetch()} />;
  if (data === undefined) return <Loading label="the post" lines={3} />;
  return (
    <pre className={styles.post} tabIndex={0}>
      {data}
    </pre>
  );
}
