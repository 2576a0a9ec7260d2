import { applyEdits, format } from 'jsonc-parser';

const LONGEST_READABLE_LINE = 160;

/** Whether a text is written for programs only. */
export const isHardToRead = (text: string): boolean =>
  text.split('\n').some((line) => line.length > LONGEST_READABLE_LINE);

/** Sets JSON out in lines. Only white space between its parts changes, so it works on broken JSON too. */
export const layOut = (text: string): string =>
  applyEdits(text, format(text, undefined, { tabSize: 2, insertSpaces: true, eol: '\n' }));
