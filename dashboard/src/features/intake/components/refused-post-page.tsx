import { Link } from 'react-router-dom';
import { Facts } from '@/components/ui/facts';
import { PageHeader } from '@/components/ui/page-header';
import { Section } from '@/components/ui/section';
import { TimeText } from '@/components/ui/time-text';
import { paths } from '@/config/paths';
import type { RefusedPost } from '@/types/api';
import { statusInWords } from '../status-words';
import { RefusedBody } from './refused-body';
import styles from './refused-post-page.module.css';

export function RefusedPostPage({ post }: { post: RefusedPost }) {
  return (
    <>
      <PageHeader
        title={`Refused post of ${post.station}`}
        lead={<Link to={paths.intake({ kind: 'refused' })}>All refused posts</Link>}
      />
      <Section title={statusInWords(post.status)}>
        <p className={styles.detail}>{post.detail}</p>
        <Facts
          facts={[
            ['Station', <Link to={paths.station(post.station)}>{post.station}</Link>],
            ['Received', <TimeText at={post.receivedAt} show="both" />],
            ['Came', post.count > 1 ? `${post.count} times` : 'once'],
            ['Last time', post.count > 1 ? <TimeText at={post.lastReceivedAt} show="both" /> : null],
            ['Part number', post.partNumber && <span className="figures">{post.partNumber}</span>],
            ['Serial number', post.serialNumber && <span className="figures">{post.serialNumber}</span>],
            ['Result', post.resultId && <span className="figures">{post.resultId}</span>],
          ]}
        />
        <p className={styles.remedy}>
          Nothing of it counts. Mend what the station sends and let it post again;{' '}
          <a href="/docs/errors">the error catalogue</a> says what each code wants.
        </p>
      </Section>
      <RefusedBody key={post.intakeId} post={post} />
    </>
  );
}
