type Schema = Record<string, unknown>;

/** Compilers order the members of a union as they please; sorted, the document is the same on every build. */
const sorted = (values: readonly unknown[]): unknown[] =>
  [...values].sort((left, right) => (String(left) < String(right) ? -1 : 1));

/**
 * Nest's swagger module writes OpenAPI 3.0's `nullable: true`, which 3.1 doesn't know: turned into a union
 * with null, throughout the document.
 */
export function withNullUnions(node: unknown): unknown {
  if (Array.isArray(node)) return node.map(withNullUnions);
  if (node === null || typeof node !== 'object') return node;
  const entries = Object.entries(node).map(
    ([key, value]) =>
      [key, key === 'enum' && Array.isArray(value) ? sorted(value) : withNullUnions(value)] as const,
  );
  const { nullable, ...schema } = Object.fromEntries<unknown>(entries);
  return nullable === true ? orNull(schema) : nullable === undefined ? schema : { ...schema };
}

function orNull(schema: Schema): Schema {
  const { allOf, $ref, description, ...rest } = schema as Schema & { allOf?: Schema[] };
  const reference = $ref !== undefined ? { $ref } : allOf?.length === 1 ? allOf[0] : undefined;
  if (reference !== undefined) {
    return { ...(description === undefined ? {} : { description }), anyOf: [reference, { type: 'null' }] };
  }
  const plain: Schema = { ...(description === undefined ? {} : { description }), ...rest };
  if (Array.isArray(plain['enum']))
    return { ...plain, type: [plain['type'], 'null'], enum: [...(plain['enum'] as unknown[]), null] };
  return plain['type'] === undefined ? plain : { ...plain, type: [plain['type'], 'null'] };
}
