import { IsIn, IsString, MaxLength, MinLength, ValidateIf } from 'class-validator';
import {
  dialects,
  type Dialect,
  type PreferencesRequest,
  type SignInRequest,
} from '@second-spanner/shared/contracts/people';

export class SignInDto implements SignInRequest {
  @MaxLength(254)
  @MinLength(1, { message: 'Enter your e-mail address.' })
  @IsString({ message: 'Enter your e-mail address.' })
  email!: string;

  @MaxLength(1000)
  @MinLength(1, { message: 'Enter your password.' })
  @IsString({ message: 'Enter your password.' })
  password!: string;
}

export class PreferencesDto implements PreferencesRequest {
  @ValidateIf(({ dialect }: PreferencesDto) => dialect !== null)
  @IsIn(dialects)
  dialect!: Dialect | null;
}
