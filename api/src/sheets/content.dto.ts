import { Type } from 'class-transformer';
import {
  ArrayMaxSize,
  IsArray,
  IsIn,
  IsInt,
  IsNumber,
  IsObject,
  IsString,
  IsUUID,
  Max,
  MaxLength,
  Min,
  ValidateNested,
} from 'class-validator';
import { units, type Unit } from '@second-spanner/shared/contracts/quantity';
import { IsWords, MayBeLeftOut } from '../platform/validation/decorators.js';

const everyUnit: readonly Unit[] = Object.values(units).flat();

export class QuantityDto {
  @IsNumber({ allowNaN: false, allowInfinity: false }, { message: 'This must be a number.' })
  value!: number;

  @IsIn(everyUnit, { message: `This must be one of ${everyUnit.join(', ')}.` })
  unit!: Unit;
}

export class AdapterDto {
  @ValidateNested()
  @IsObject()
  @Type(() => QuantityDto)
  length!: QuantityDto;

  @Max(360)
  @Min(-360)
  @IsNumber()
  angle!: number;
}

class ContentDto {
  @IsString()
  kind!: string;
}

class WithTool extends ContentDto {
  @IsUUID(undefined, { message: 'Choose a tool from the register.' })
  toolId!: string;
}

export class CheckContentDto extends ContentDto {
  @IsIn(['pass', 'fail'], { message: 'This must be pass or fail.' })
  outcome!: 'pass' | 'fail';

  @IsWords(500)
  @MayBeLeftOut()
  note?: string;
}

export class MeasurementContentDto extends WithTool {
  @IsWords(100)
  at!: string;

  @ValidateNested()
  @IsObject({ message: 'Enter the reading with its unit.' })
  @Type(() => QuantityDto)
  value!: QuantityDto;
}

export class TighteningContentDto extends WithTool {
  @Max(20)
  @Min(1)
  @IsInt()
  pass!: number;

  @IsWords(50)
  fastener!: string;

  @ValidateNested()
  @IsObject()
  @MayBeLeftOut()
  @Type(() => QuantityDto)
  setting?: QuantityDto;

  @ValidateNested()
  @IsObject()
  @MayBeLeftOut()
  @Type(() => QuantityDto)
  reading?: QuantityDto;

  @IsNumber()
  @MayBeLeftOut()
  angle?: number;

  @ValidateNested()
  @IsObject()
  @MayBeLeftOut()
  @Type(() => AdapterDto)
  adapter?: AdapterDto;
}

/** What is at each outlet; names and cylinders are checked against the cap. */
export class WiringContentDto extends ContentDto {
  @IsObject({ message: 'Say for every outlet which cylinder is on it.' })
  fitted!: object;
}

/** What was seen at each position; the sightings are checked against the engine. */
export class ValveTimingContentDto extends ContentDto {
  @ArrayMaxSize(50)
  @IsArray()
  sightings!: unknown[];

  @Max(49)
  @Min(0)
  @IsInt()
  @MayBeLeftOut()
  about?: number;
}

export class PhotoContentDto extends ContentDto {
  @MaxLength(200)
  @IsString()
  shows!: string;

  @IsUUID(undefined, { message: 'Store the photo first.' })
  fileId!: string;
}
