/** What a station needs of the answer to its post. */
export interface ResultAnswer {
  resultId: string;
  verdict: 'pass' | 'fail' | 'notProven' | 'unjudged' | 'aborted';
  disposition: 'next' | 'retest' | 'retestElsewhere' | 'repair' | 'hold' | 'stop';
}
