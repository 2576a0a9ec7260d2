export class ProblemErrorDto {
  /**
   * JSON Pointer (RFC 6901) to the place; empty for the whole.
   * @example "/points/3/loadVolts"
   */
  pointer!: string;
  /** @example "required" */
  code!: string;
  /** What is wrong there and what to do. */
  detail!: string;
}

/** Problem document (RFC 9457). */
export class ProblemDto {
  /**
   * Where the docs explain it.
   * @example "/docs/errors#invalid"
   */
  type!: string;
  /** @example "The content is not valid" */
  title!: string;
  /** @example 422 */
  status!: number;
  detail!: string;
  /**
   * Stable; write your program against it.
   * @example "invalid"
   */
  code!: string;
  errors?: ProblemErrorDto[];
}
