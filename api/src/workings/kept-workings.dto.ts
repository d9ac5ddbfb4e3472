import { IsObject, Matches } from 'class-validator';
import type { KeepWorkingRequest } from '@second-spanner/shared/contracts/kept-workings';
import { IsWords } from '../platform/validation/decorators.js';

export class KeepWorkingDto implements KeepWorkingRequest {
  @Matches(/^[a-z0-9-]{1,60}$/, { message: 'This must be the key of a working.' })
  working!: string;

  @IsWords(200)
  title!: string;

  /** Its names and texts are checked against the working's fields. */
  @IsObject({ message: 'Say what was typed, by field.' })
  typed!: Readonly<Record<string, string>>;
}
