import { BreachDto } from './breach.dto.js';

export class BreachPageDto {
  /** Newest opened first. */
  items!: BreachDto[];
  /** Give it back as `cursor` for older ones; null at the end. */
  nextCursor!: string | null;
}
