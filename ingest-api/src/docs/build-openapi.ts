import type { INestApplication } from '@nestjs/common';
import { DocumentBuilder, type OpenAPIObject, SwaggerModule } from '@nestjs/swagger';
import { SESSION_COOKIE } from '../auth/session-cookie.js';
import { ampkeepVersion } from '../config/version.js';
import { resultSchema } from '../results/validate-post.js';
import { completeOperations } from './openapi-operations.js';
import { withNullUnions } from './openapi-nullables.js';

const description = `Test stations post load-regulation results; Ampkeep keeps and judges them.

A station needs two things: an API key from the Stations page, sent as \`X-API-Key\`, and \`POST /api/v1/results\`.
Errors are RFC 9457 problem documents with JSON Pointers; their codes are explained at [/docs/errors](/docs/errors).
The schema of a post is at [/docs/result.schema.json](/docs/result.schema.json).

Ampkeep judges results. It is no safety function, and a verdict is no calibration certificate.`;

/** The groups of the API docs, in their order. Every operation belongs to one. */
const groups: Readonly<Record<string, string>> = {
  results: 'Posting results, and reading them back',
  'for stations': 'What a station asks before it tests, and its sign of life',
  line: 'The line as it is today, its yields, and changes as they happen',
  units: 'Units with their history',
  breaches: 'What broke a rule: acknowledge it, close it with cause and action',
  products: 'Products with their stages, test plans and limits in force',
  stations: 'Stations, their instruments and their API keys',
  intake: 'Everything that came in, accepted or refused',
  mailbox: "The demo's mails",
  accounts: 'Signing in, accounts, roles and the audit trail',
  proof: 'Published figures, recomputed by this installation',
  site: 'Name and health of this installation',
};

/** The OpenAPI 3.1 document, made from the code alone. */
export function buildOpenApi(app: INestApplication): OpenAPIObject {
  const builder = new DocumentBuilder()
    .setTitle('Ampkeep')
    .setDescription(description)
    .setVersion(ampkeepVersion)
    .setOpenAPIVersion('3.1.0')
    .setLicense('MIT', 'https://spdx.org/licenses/MIT.html')
    .addServer('/')
    .addSecurity('stationKey', {
      type: 'apiKey',
      in: 'header',
      name: 'X-API-Key',
      description: "A station's key, from the Stations page",
    })
    .addSecurity('session', {
      type: 'apiKey',
      in: 'cookie',
      name: SESSION_COOKIE,
      description: "A person's session, set by signing in",
    });
  for (const [name, purpose] of Object.entries(groups)) builder.addTag(name, purpose);
  const document = SwaggerModule.createDocument(app, builder.build(), {
    operationIdFactory: (controller, method) => `${controller.replace(/Controller$/, '')}_${method}`,
  });
  const united = completeOperations(withNullUnions(document) as OpenAPIObject);
  const schemas = { ...united.components?.schemas, ...postedResultSchemas() };
  return { ...united, components: { ...united.components, schemas: sortByName(schemas) } };
}

/** The result schema as components: its `$defs` become components of their own, so that every tool finds them. */
function postedResultSchemas(): Record<string, object> {
  const nameOf = (definition: string): string =>
    `Posted${definition[0]!.toUpperCase()}${definition.slice(1)}`;
  const text = JSON.stringify(resultSchema).replace(
    /"#\/\$defs\/(\w+)"/g,
    (_, definition: string) => `"#/components/schemas/${nameOf(definition)}"`,
  );
  const { $defs, $id, $schema, ...schema } = JSON.parse(text) as {
    $defs: Record<string, object>;
    $id: string;
    $schema: string;
  };
  void $id;
  void $schema;
  return {
    PostedResult: schema,
    ...Object.fromEntries(Object.entries($defs).map(([definition, value]) => [nameOf(definition), value])),
  };
}

const sortByName = <Value>(record: Record<string, Value>): Record<string, Value> =>
  Object.fromEntries(Object.entries(record).sort(([left], [right]) => (left < right ? -1 : 1)));
