import { useState } from 'react';
import { Link } from 'react-router-dom';
import { EmptyState } from '@/components/ui/empty-state';
import { TextField } from '@/components/ui/text-field';
import { paths } from '@/config/paths';
import type { Product } from '@/types/api';
import { curlCommand } from '../curl-command';
import { useExample } from '../use-example';
import { Arrival } from './arrival';
import { CommandSheet } from './command-sheet';
import styles from './first-post.module.css';
import { ProductChoice } from './product-choice';
import { Step } from './step';

/** From a key to the first accepted result, in five steps. */
export function FirstPost({ products }: { products: Product[] }) {
  const [key, setKey] = useState('');
  const example = useExample(products);
  if (!example) {
    return (
      <EmptyState title="No product is set up here yet.">
        A post names a part number and a stage of this site. As soon as there is one, the example is built for
        it.
      </EmptyState>
    );
  }
  const { product, stage, post, choose } = example;
  return (
    <ol className={styles.steps}>
      <Step title="Get a key">
        <p>
          Open the station under <Link to={paths.stations()}>Stations</Link> and create a key; a practice key
          is a good first one. Paste it here to have it in the command. It stays in this page and is sent
          nowhere.
        </p>
        <div className={styles.key}>
          <TextField
            label="Key"
            value={key}
            onChange={(text) => setKey(text.trim())}
            autoComplete="off"
            placeholder="amk_…"
          />
        </div>
      </Step>
      <Step title="Choose what is tested">
        <ProductChoice products={products} product={product} stage={stage} onChange={choose} />
      </Step>
      <Step title="Send it">
        <p>
          The readings are invented and the post says that it is practice: it is judged and shown, but counts
          nowhere. Sending it twice is harmless, since it names itself by its <code>resultId</code>.
        </p>
        <CommandSheet command={curlCommand(window.location.origin, key, post)} />
      </Step>
      <Step title="See it arrive">
        <Arrival resultId={post.resultId} />
        <p className={styles.note}>
          The answer is <code>201</code> with the verdict and where the unit goes next. Nothing arrives here?
          Then the answer says why: <code>401</code> is a key that was not copied whole, <code>403</code> one
          that was revoked or has expired. <a href="/docs/errors">All errors</a>
        </p>
      </Step>
      <Step title="Teach it to the station">
        <p>
          Give every measurement a UUID of its own and <code>"runKind": "production"</code>. Keep each post
          until it was answered with <code>2xx</code>, which means that it is on disk; on <code>429</code>,{' '}
          <code>503</code> or no answer send the very same post again, later. A <code>4xx</code> wants a
          person: what came with a valid key is kept under{' '}
          <Link to={paths.intake({ kind: 'refused' })}>Intake</Link>.
        </p>
      </Step>
    </ol>
  );
}
