import type { ProblemError } from '@/types/api';
import type { MarkedLine, Segment } from '../marked-lines';
import { placeId } from '../place-id';
import styles from './posted-body.module.css';

export interface PostedBodyProps {
  lines: MarkedLine[];
  errors: ProblemError[];
}

/** The posted text by lines, as text and nothing else; faults are marked, their reasons stand below the line. */
export function PostedBody({ lines, errors }: PostedBodyProps) {
  const firstLines = linesOfReasons(lines);
  return (
    <div className={styles.frame} role="region" aria-label="The posted body" tabIndex={0}>
      <ol className={styles.lines}>
        {lines.map((line, number) => (
          <li key={number} className={line.reasons.length > 0 ? styles.faulty : styles.line}>
            <code className={styles.text}>
              {line.segments.map((segment, place) => (
                <Piece
                  key={place}
                  segment={segment}
                  isFirst={segment.reason !== null && firstLines.get(segment.reason) === number}
                />
              ))}
            </code>
            {line.reasons.map((reason) => (
              <p
                key={reason}
                className={styles.reason}
                // A place without a sign of its own (the text broke off) is its reason.
                {...(line.segments.every((segment) => segment.reason !== reason) && {
                  id: placeId(reason),
                  tabIndex: -1,
                })}
              >
                {errors[reason]?.detail}
              </p>
            ))}
          </li>
        ))}
      </ol>
    </div>
  );
}

function Piece({ segment: { text, reason }, isFirst }: { segment: Segment; isFirst: boolean }) {
  if (reason === null) return <>{text}</>;
  return (
    <mark className={styles.mark} {...(isFirst && { id: placeId(reason), tabIndex: -1 })}>
      {text}
    </mark>
  );
}

function linesOfReasons(lines: MarkedLine[]): Map<number, number> {
  const first = new Map<number, number>();
  lines.forEach(({ segments }, number) => {
    for (const { reason } of segments) if (reason !== null && !first.has(reason)) first.set(reason, number);
  });
  return first;
}
