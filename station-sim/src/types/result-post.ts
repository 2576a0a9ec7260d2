import type { components } from './api.generated.js';

/** The post of the station contract, version 1. */
export type ResultPost = components['schemas']['PostedResult'];
export type PostedPoint = ResultPost['points'][number];
