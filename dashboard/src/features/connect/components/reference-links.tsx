import styles from './reference-links.module.css';

const references = [
  { href: '/docs', name: 'API reference', what: 'every operation with its answers and examples' },
  { href: '/docs/errors', name: 'Error catalogue', what: 'each code, what it means, what to do' },
  {
    href: '/docs/result.schema.json',
    name: 'JSON Schema of a result',
    what: 'to check posts before they are sent',
  },
  { href: '/docs/openapi.yaml', name: 'OpenAPI document', what: 'to generate a client from' },
];

/** Pages of the server itself, outside the dashboard. */
export function ReferenceLinks() {
  return (
    <ul>
      {references.map(({ href, name, what }) => (
        <li key={href} className={styles.reference}>
          <a href={href}>{name}</a>
          <span className={styles.what}>{what}</span>
        </li>
      ))}
    </ul>
  );
}
