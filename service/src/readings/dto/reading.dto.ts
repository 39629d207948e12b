import { ApiProperty, ApiPropertyOptional } from '@nestjs/swagger';
import { Type } from 'class-transformer';
import {
  ArrayMaxSize,
  ArrayMinSize,
  IsArray,
  IsIn,
  IsInt,
  IsOptional,
  IsString,
  MaxLength,
  ValidateBy,
  ValidateNested,
} from 'class-validator';
import { SEEN, type Seen, type Take, TAKES } from '../../engine';
import { CLIENT_ID_MOST, NOTE_MOST, READINGS_MOST } from '../reading.limits';
import { asReading, type ReadingRow } from '../reading.model';

const VALUE_SCHEMA = { oneOf: [{ type: 'number' }, { type: 'string', enum: ['OL'] }] };

/** A finite number or OL. */
function IsReadingValue() {
  return ValidateBy({
    name: 'readingValue',
    validator: {
      validate: (value: unknown) =>
        value === 'OL' || (typeof value === 'number' && Number.isFinite(value)),
      defaultMessage: () => 'A value is a number in volts, amps or ohms, or OL.',
    },
  });
}

/** Two node names, red lead first. */
function IsLeads() {
  return ValidateBy({
    name: 'leads',
    validator: {
      validate: (value: unknown) =>
        Array.isArray(value) &&
        value.length === 2 &&
        value.every((node) => typeof node === 'string' && node.length <= 40),
      defaultMessage: () => 'Name the two nodes the leads were on, red lead first.',
    },
  });
}

export class EnterReadingDto {
  @ApiPropertyOptional({
    maxLength: CLIENT_ID_MOST,
    description: 'Sent twice with the same name it is entered once.',
  })
  @IsOptional()
  @IsString()
  @MaxLength(CLIENT_ID_MOST)
  clientId?: string;

  @ApiProperty({ enum: TAKES, enumName: 'Take' })
  @IsIn(TAKES, { message: 'Choose what kind of reading it is.' })
  take: Take;

  @ApiPropertyOptional({
    type: [String],
    minItems: 2,
    maxItems: 2,
    description: 'Red lead, black lead.',
  })
  @IsOptional()
  @IsLeads()
  at?: [string, string];

  @ApiPropertyOptional()
  @IsOptional()
  @IsString()
  @MaxLength(24)
  part?: string;

  @ApiPropertyOptional(VALUE_SCHEMA)
  @IsOptional()
  @IsReadingValue()
  value?: number | 'OL';

  @ApiPropertyOptional({ enum: SEEN, enumName: 'Seen' })
  @IsOptional()
  @IsIn(SEEN, { message: 'Choose what was seen.' })
  seen?: Seen;

  @ApiPropertyOptional({
    description: 'One of the person’s meters; left out it is a 10 MΩ digital meter.',
  })
  @IsOptional()
  @IsInt()
  meterId?: number;

  @ApiPropertyOptional({ maxLength: NOTE_MOST })
  @IsOptional()
  @IsString()
  @MaxLength(NOTE_MOST)
  note?: string;
}

export class EnterReadingsDto {
  @ApiProperty({ type: [EnterReadingDto] })
  @IsArray()
  @ArrayMinSize(1, { message: 'Send at least one reading.' })
  @ArrayMaxSize(READINGS_MOST, { message: `Send at most ${READINGS_MOST} readings at once.` })
  @ValidateNested({ each: true })
  @Type(() => EnterReadingDto)
  readings: EnterReadingDto[];
}

export class CaseReadingDto {
  @ApiProperty() id: number;
  @ApiPropertyOptional() clientId?: string;
  @ApiProperty({ enum: TAKES, enumName: 'Take' }) take: Take;
  @ApiProperty({ description: 'Take and place as one word.' }) place: string;
  @ApiPropertyOptional({ type: [String], minItems: 2, maxItems: 2 }) at?: [string, string];
  @ApiPropertyOptional() part?: string;
  @ApiPropertyOptional(VALUE_SCHEMA) value?: number | 'OL';
  @ApiPropertyOptional({ enum: SEEN, enumName: 'Seen' }) seen?: Seen;
  @ApiPropertyOptional({
    type: 'object',
    additionalProperties: true,
    description: 'The meter it was taken with.',
  })
  meter?: Record<string, unknown>;
  @ApiProperty() note: string;
  @ApiProperty({ description: 'Who took it.' }) takenBy: string;
  @ApiProperty({ format: 'date-time' }) takenAt: string;
  @ApiProperty({ description: 'A later reading at the same place counts instead.' })
  isReplaced: boolean;
  @ApiProperty() isWithdrawn: boolean;
}

/** A reading as it leaves the server. */
export function presentReading(row: ReadingRow): CaseReadingDto {
  const { meter, ...reading } = asReading(row);
  return {
    id: row.id,
    ...(row.clientId ? { clientId: row.clientId } : {}),
    ...reading,
    ...(meter ? { meter: meter as Record<string, unknown> } : {}),
    place: row.place,
    note: row.note,
    takenBy: row.takenBy?.name ?? '',
    takenAt: row.createdAt.toISOString(),
    isReplaced: row.replacedAt !== null,
    isWithdrawn: row.withdrawnAt !== null,
  };
}
