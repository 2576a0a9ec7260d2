import type { components } from './api.generated.js';

/** What a station needs of the answer to its post. */
export type ResultAnswer = Pick<
  components['schemas']['ResultAnswerDto'],
  'resultId' | 'verdict' | 'disposition'
>;
