import { Ajv2020, type Options } from 'ajv/dist/2020.js';
import addFormats from 'ajv-formats';

/** A validator for JSON Schema 2020-12 with the standard formats, strict about the schemas themselves. */
export function createAjv(options: Options = {}): Ajv2020 {
  const ajv = new Ajv2020({
    allErrors: true,
    strict: true,
    strictTypes: false,
    strictRequired: false,
    ...options,
  });
  // Its types are written for another copy of ajv.
  (addFormats.default as unknown as (target: Ajv2020) => void)(ajv);
  return ajv;
}
