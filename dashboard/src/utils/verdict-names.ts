import type { Verdict } from '@/types/api';

export const verdictNames: Record<Verdict, string> = {
  pass: 'Pass',
  fail: 'Fail',
  notProven: 'Not proven',
  unjudged: 'Not judged',
  aborted: 'Aborted',
};
