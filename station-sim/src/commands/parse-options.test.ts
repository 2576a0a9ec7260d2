import { writeFile } from 'node:fs/promises';
import { describe, expect, it } from 'vitest';
import { withTemporaryFile } from '../testing/builders.js';
import { parseOptions, UsageError } from './parse-options.js';
import { readKeyFile } from './read-key-file.js';

const parse = (...argv: string[]) => parseOptions(argv, 'from the clock');

describe('the command line', () => {
  it('needs nothing but a key file', () => {
    expect(parse('--key-file', 'keys.json')).toEqual({
      stations: 3,
      testsPerSecond: 1,
      count: 100,
      seed: 'from the clock',
      url: 'http://localhost:4780',
      keyFile: 'keys.json',
      scenario: 'steady',
      spoolFile: 'data/station-sim.spool.ndjson',
      quiet: false,
    });
  });

  it('takes every option', () => {
    const line =
      '--key-file k --stations 2 --rate 2.5 --count 0 --seed 42 --url http://hub:1/ --scenario one-fail';
    expect(parse(...line.split(' '), '--spool', 's', '--quiet')).toEqual({
      stations: 2,
      testsPerSecond: 2.5,
      count: 0,
      seed: '42',
      url: 'http://hub:1',
      keyFile: 'k',
      scenario: 'one-fail',
      spoolFile: 's',
      quiet: true,
    });
  });

  it.each([
    ['--stations is "7", must be a whole number from 1 to 6', ['--stations', '7']],
    ['--stations is "1.5"', ['--stations', '1.5']],
    ['--rate is "fast"', ['--rate', 'fast']],
    ['--rate is ""', ['--rate', '']],
    ['--url is "localhost:4780"', ['--url', 'localhost:4780']],
    [
      '--scenario is "chaos", must be one of steady, one-fail, drift, bad-lot, coarse-meter, poor-contact, outage',
      ['--scenario', 'chaos'],
    ],
    ['--speed', ['--speed', '3']],
  ])('is refused: %s', (message, argv) => {
    expect(() => parse('--key-file', 'k', ...argv)).toThrow(UsageError);
    expect(() => parse('--key-file', 'k', ...argv)).toThrow(message);
  });

  it('is refused without a key file', () => {
    expect(() => parse()).toThrow('--key-file is missing');
  });

  it('asks for help whatever else it says', () => {
    expect(parse('--help')).toBeNull();
  });
});

describe('the key file', () => {
  it('holds a key for every station that takes part', () =>
    withTemporaryFile('keys.json', async (file) => {
      await writeFile(file, '{ "north-1": "amk_a", "north-2": "amk_b" }');
      expect(await readKeyFile(file, 2)).toEqual({ 'north-1': 'amk_a', 'north-2': 'amk_b' });
      await expect(readKeyFile(file, 3)).rejects.toThrow(`holds no key for north-3`);
    }));

  it('never repeats what it holds in a message', () =>
    withTemporaryFile('keys.json', async (file) => {
      await writeFile(file, '{ "north-1": "amk_secret"');
      const message = await readKeyFile(file, 1).catch((error: unknown) => String(error));
      expect(message).toContain('UsageError');
      expect(message).not.toContain('amk_secret');
    }));

  it('is missed by name', async () => {
    await expect(readKeyFile('no-such-file.json', 1)).rejects.toThrow(UsageError);
  });
});
