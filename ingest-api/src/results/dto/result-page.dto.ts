import { RunItemDto } from './run-item.dto.js';

export class ResultPageDto {
  items!: RunItemDto[];
  /** Give it back as `cursor` for older ones; null at the end. */
  nextCursor!: string | null;
}
