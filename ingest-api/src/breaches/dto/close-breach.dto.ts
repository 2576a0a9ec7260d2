import { TrimmedText } from './trimmed-text.decorator.js';

export class CloseBreachDto {
  /**
   * Why it happened.
   * @example "A reel of transistors with a low Early voltage."
   */
  @TrimmedText()
  cause!: string;

  /**
   * What was done so that it doesn't return.
   * @example "Reel returned, incoming check of the Early voltage added."
   */
  @TrimmedText()
  action!: string;
}
