import { textParts, type TextPart } from '../text-parts';
import styles from './mail-text.module.css';

/** A mail's plain text, as text; addresses in it are links. */
export function MailText({ text }: { text: string }) {
  return (
    <pre className={styles.text}>
      {textParts(text).map((part, place) => (
        <Part key={place} part={part} />
      ))}
    </pre>
  );
}

function Part({ part: { text, href } }: { part: TextPart }) {
  return href === null ? <>{text}</> : <a href={href}>{text}</a>;
}
