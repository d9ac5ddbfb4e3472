import {
  IsArray,
  ArrayMaxSize,
  IsIn,
  IsObject,
  IsString,
  IsUUID,
  MaxLength,
  MinLength,
} from 'class-validator';
import {
  settlements,
  signatureMeanings,
  type NewCountersignatureRequest,
  type NewSheetRequest,
  type NewSnagRequest,
  type SendBackRequest,
  type Settlement,
  type SettleSnagRequest,
  type SignatureMeaning,
  type SignRequest,
  type UnmarkCriticalRequest,
} from '@second-spanner/shared/contracts/sheets';
import { IsWords, MayBeLeftOut } from '../platform/validation/decorators.js';

const longest = 1000;

export class NewSheetDto implements NewSheetRequest {
  @IsUUID(undefined, { message: 'Choose a car.' })
  carId!: string;

  @IsUUID(undefined, { message: 'Choose an edition of a spec.' })
  specEditionId!: string;

  @IsUUID(undefined, { message: 'Choose a builder.' })
  builderId!: string;

  @IsUUID(undefined, { message: 'Choose a second person.' })
  countersignerId!: string;
}

export class NewEntryDto {
  /** Checked by its kind. */
  @IsObject({ message: 'Say what was recorded.' })
  content!: object;

  @IsUUID(undefined, { message: 'This must be the id of an entry.' })
  @MayBeLeftOut()
  replaces?: string;

  @IsWords(longest)
  @MayBeLeftOut()
  reason?: string;
}

export class NewSecondReadingDto {
  /** Checked by its kind. */
  @IsObject({ message: 'Say what you read.' })
  content!: object;
}

export class NewCountersignatureDto implements NewCountersignatureRequest {
  @IsIn(['agree', 'dispute'], { message: 'This must be agree or dispute.' })
  outcome!: 'agree' | 'dispute';

  @IsWords(longest)
  @MayBeLeftOut()
  reason?: string;

  @IsWords(50, { each: true })
  @ArrayMaxSize(200)
  @IsArray()
  @MayBeLeftOut()
  pullsWitnessed?: string[];
}

export class NewSnagDto implements NewSnagRequest {
  @IsWords(longest)
  words!: string;
}

export class SettleSnagDto implements SettleSnagRequest {
  @IsIn(settlements, { message: `This must be one of ${settlements.join(', ')}.` })
  how!: Settlement;

  @IsWords(longest)
  reason!: string;
}

export class UnmarkCriticalDto implements UnmarkCriticalRequest {
  @IsWords(longest)
  reason!: string;
}

export class SignDto implements SignRequest {
  @IsIn(signatureMeanings, { message: `This must be one of ${signatureMeanings.join(', ')}.` })
  meaning!: SignatureMeaning;

  @MaxLength(1000)
  @MinLength(1, { message: 'Enter your password.' })
  @IsString({ message: 'Enter your password.' })
  password!: string;
}

export class SendBackDto implements SendBackRequest {
  @IsWords(longest)
  reason!: string;
}
