/** One thing that is wrong with an input: where, and what would be right. */
export interface FieldError {
  readonly field: string;
  readonly message: string;
}

/** Thrown by every calculation for input it cannot use. `field` is a path such as `firingOrder[2]`. */
export class InputError extends Error implements FieldError {
  override readonly name = 'InputError';

  constructor(
    readonly field: string,
    message: string,
  ) {
    super(message);
  }
}
