import fc from 'fast-check';
import { MalformedError } from '../common/errors.js';
import { parsePost, pointerOf } from './parse-post.js';
import { canonicalSha256 } from './prepare-result.js';

const parse = (text: string): unknown => parsePost(Buffer.from(text));
/** Writes a value with the names of each object in reverse and with white space all over. */
function rewrite(value: unknown): string {
  if (Array.isArray(value)) return `[ ${value.map(rewrite).join(' ,\t')}\n]`;
  if (value === null || typeof value !== 'object') return JSON.stringify(value);
  const entries = Object.entries(value).reverse();
  return `{\r\n${entries.map(([name, inner]) => `${JSON.stringify(name)} : ${rewrite(inner)}`).join(' , ')} }`;
}
const values = fc.jsonValue({ maxDepth: 4 });

describe('reading a post', () => {
  it('gives what JSON.parse gives for all JSON that has one reading', () => {
    fc.assert(
      fc.property(values, (value) =>
        expect(parse(JSON.stringify(value))).toEqual(JSON.parse(JSON.stringify(value))),
      ),
    );
  });

  it('finds every name that is given twice, at any depth', () => {
    fc.assert(
      fc.property(fc.array(fc.constantFrom('a', 'b~', 'c/'), { maxLength: 6 }), fc.string(), (path, name) => {
        const twice = `{${JSON.stringify(name)}:1,"x":[],${JSON.stringify(name)}:1}`;
        const text = path.reduceRight((inner, key) => `{${JSON.stringify(key)}:${inner}}`, twice);
        const error = caught(() => parse(text));
        expect(error.errors).toContainEqual(
          expect.objectContaining({ code: 'duplicateName', pointer: pointerOf([...path, name]) }),
        );
      }),
    );
  });

  it('throws nothing but a MalformedError, whatever the bytes', () => {
    fc.assert(
      fc.property(fc.uint8Array({ maxLength: 60 }), (bytes) => {
        try {
          parsePost(Buffer.from(bytes));
        } catch (error) {
          expect(error).toBeInstanceOf(MalformedError);
        }
      }),
    );
  });

  it('allows twelve levels and no more', () => {
    expect(parse('['.repeat(12) + ']'.repeat(12))).toBeDefined();
    expect(() => parse('['.repeat(13) + ']'.repeat(13))).toThrow(/deeper/);
    expect(() => parse('{"a":'.repeat(13) + '1' + '}'.repeat(13))).toThrow(/deeper/);
  });
});

describe('a JSON Pointer', () => {
  // The examples of RFC 6901, section 5, as far as they have names.
  it.each([
    [[], ''],
    [['foo', 0], '/foo/0'],
    [[''], '/'],
    [['a/b'], '/a~1b'],
    [['m~n'], '/m~0n'],
    [['~1'], '/~01'],
  ])('of %j is %j', (path, pointer) => {
    expect(pointerOf(path)).toBe(pointer);
  });
});

describe('the fingerprint of a post', () => {
  it('is that of its content, however it is written', () => {
    fc.assert(
      fc.property(values, (value) => {
        expect(canonicalSha256(parse(rewrite(value)))).toBe(canonicalSha256(parse(JSON.stringify(value))));
      }),
    );
    expect(canonicalSha256(parse('[1e2, 0.50, -0, 1E-7]'))).toBe(
      canonicalSha256(parse('[100, 5e-1, 0, 0.0000001]')),
    );
  });

  it('differs when anything in it differs', () => {
    const near = [
      '1',
      '"1"',
      'null',
      '[]',
      '{}',
      '[1]',
      '[[1]]',
      '[1,1]',
      '{"a":1}',
      '{"a":"1"}',
      '{"b":1}',
      '{"":1}',
    ];
    expect(new Set(near.map((text) => canonicalSha256(parse(text)))).size).toBe(near.length);
  });

  // From memory of RFC 8785, section 3.2.3: names are sorted by UTF-16 units, not by code points.
  it('sorts names by their UTF-16 units', () => {
    const names = ['\u20ac', '\r', '\ufb33', '1', '\ud83d\ude00', '\u0080', '\u00f6'];
    const text = (list: string[]) => `{${list.map((name) => `${JSON.stringify(name)}:0`).join(',')}}`;
    expect(canonicalSha256(parse(text(names)))).toBe(canonicalSha256(parse(text([...names].sort()))));
  });
});

function caught(act: () => unknown): MalformedError {
  try {
    act();
  } catch (error) {
    if (error instanceof MalformedError) return error;
  }
  throw new Error('Nothing was thrown');
}
