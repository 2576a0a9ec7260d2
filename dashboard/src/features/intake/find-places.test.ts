import { describe, expect, it } from 'vitest';
import type { ProblemError } from '@/types/api';
import { findPlaces } from './find-places';

const fault = (pointer: string, code = 'type'): ProblemError => ({ pointer, code, detail: 'Wrong.' });

/** The marked texts, by reason. */
const marked = (text: string, errors: ProblemError[]): [number, string][] =>
  findPlaces(text, errors).map(({ reason, offset, length }) => [reason, text.slice(offset, offset + length)]);

describe('findPlaces', () => {
  it('finds a value inside arrays and objects', () => {
    const text = '{"points":[{"loadVolts":0},{"loadVolts":"1.2"}]}';
    expect(marked(text, [fault('/points/1/loadVolts')])).toEqual([[0, '"1.2"']]);
  });

  it('marks the name of an unknown property and of a whole array', () => {
    const text = '{"loadVolt":3,"points":[]}';
    expect(marked(text, [fault('/loadVolt', 'unknownProperty'), fault('/points', 'minItems')])).toEqual([
      [0, '"loadVolt"'],
      [1, '"points"'],
    ]);
  });

  it('marks both places of a name that is given twice', () => {
    expect(marked('{"a":1,"a":2}', [fault('/a', 'duplicateName')])).toEqual([
      [0, '"a"'],
      [0, '"a"'],
    ]);
    expect(findPlaces('{"a":1,"a":2}', [fault('/a', 'duplicateName')]).map(({ offset }) => offset)).toEqual([
      1, 7,
    ]);
  });

  it('places a missing name at the object that lacks it', () => {
    const text = '{"ammeter":{"rangeAmps":1},"points":[{"loadVolts":0}]}';
    expect(
      marked(text, [
        fault('/resultId', 'required'),
        fault('/ammeter/serialNumber', 'required'),
        fault('/points/0/outputAmps', 'required'),
      ]),
    ).toEqual([
      [0, '{'],
      [1, '"ammeter"'],
      [2, '{'],
    ]);
    expect(findPlaces(text, [fault('/points/0/outputAmps', 'required')])[0]?.offset).toBe(37);
  });

  it('reads escaped names', () => {
    expect(marked('{"a/b":{"c~d":5}}', [fault('/a~1b/c~0d')])).toEqual([[0, '5']]);
  });

  it('marks the sign that could not be read', () => {
    const text = '{"serialNumber": <script>}';
    expect(findPlaces(text, [fault('/serialNumber', 'json')])[0]?.offset).toBe(text.indexOf('<'));
  });

  it('finds nothing in an empty text', () => {
    expect(findPlaces('', [fault('/a')])).toEqual([]);
  });
});
