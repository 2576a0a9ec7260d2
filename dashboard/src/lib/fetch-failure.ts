/** Whether the code of a page did not arrive. Browsers word it differently and give it no type of its own. */
export const isFetchFailure = (error: unknown): boolean =>
  error instanceof Error &&
  /dynamically imported module|module script failed|preload CSS/i.test(error.message);
