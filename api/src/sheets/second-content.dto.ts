import { Type } from 'class-transformer';
import { ArrayMaxSize, IsArray, IsIn, IsObject, IsString, IsUUID, ValidateNested } from 'class-validator';
import { IsWords, MayBeLeftOut } from '../platform/validation/decorators.js';
import { QuantityDto } from './content.dto.js';

export class PlaceReadingDto {
  @IsWords(100)
  at!: string;

  @ValidateNested()
  @IsObject({ message: 'Enter the reading with its unit.' })
  @Type(() => QuantityDto)
  value!: QuantityDto;
}

export class MeasuredAgainDto {
  @IsString()
  kind!: string;

  @IsUUID(undefined, { message: 'Choose a tool from the register.' })
  toolId!: string;

  @ValidateNested({ each: true })
  @ArrayMaxSize(100)
  @IsArray()
  @Type(() => PlaceReadingDto)
  readings!: PlaceReadingDto[];
}

export class SettingSeenDto {
  @IsString()
  kind!: string;

  @IsUUID(undefined, { message: 'Choose the wrench from the register.' })
  toolId!: string;

  @ValidateNested()
  @IsObject({ message: 'Enter the setting that you read on the wrench.' })
  @Type(() => QuantityDto)
  setting!: QuantityDto;
}

export class InspectedDto {
  @IsString()
  kind!: string;

  @IsIn(['pass', 'fail'], { message: 'This must be pass or fail.' })
  outcome!: 'pass' | 'fail';

  @IsWords(200, { each: true })
  @ArrayMaxSize(50)
  @IsArray()
  seen!: string[];

  @IsWords(500)
  @MayBeLeftOut()
  note?: string;
}
