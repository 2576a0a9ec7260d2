import { TrimmedText } from './trimmed-text.decorator.js';

export class AcknowledgeBreachDto {
  /**
   * What you know and what you do next.
   * @example "Lot L2648-2 on hold, checking the transistor pairs."
   */
  @TrimmedText()
  note!: string;
}
