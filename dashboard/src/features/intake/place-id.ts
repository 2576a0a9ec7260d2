/** Id of the first mark of a reason in the posted body. */
export const placeId = (reason: number): string => `place-${reason + 1}`;
