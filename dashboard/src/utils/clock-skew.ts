/** A station's clock further off than this is flagged, here as in the intake. */
export const LARGEST_CLOCK_SKEW_SECONDS = 30;
