const words: Record<number, string> = {
  201: 'accepted',
  400: 'not JSON',
  409: 'identity taken',
  413: 'too large',
  415: 'not sent as JSON',
  422: 'against the contract',
};

/** What a post was answered with: "422 against the contract". */
export const statusInWords = (status: number): string => `${status} ${words[status] ?? 'refused'}`;
