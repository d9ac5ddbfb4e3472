import { Matches, MaxLength, ValidateIf, type ValidationOptions } from 'class-validator';

/** The field may be missing; null is not the same. */
export const MayBeLeftOut = (): PropertyDecorator =>
  ValidateIf((_object, value: unknown) => value !== undefined);

/** A text that says something: not blank, no control characters but line ends, at most `max` characters. */
export function IsWords(max: number, options: ValidationOptions = {}): PropertyDecorator {
  const limits = [
    MaxLength(max, { ...options, message: `This must have at most ${max} characters.` }),
    Matches(/^(?=[^]*\S)[^\p{Cc}\p{Surrogate}]*(?:[\n\t][^\p{Cc}\p{Surrogate}]*)*$/u, {
      ...options,
      message: 'This must be a text that says something.',
    }),
  ];
  return (target, property) => {
    for (const limit of limits) limit(target, property);
  };
}
