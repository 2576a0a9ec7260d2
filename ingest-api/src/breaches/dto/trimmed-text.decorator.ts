import { applyDecorators } from '@nestjs/common';
import { ApiProperty } from '@nestjs/swagger';
import { Transform } from 'class-transformer';
import { IsString, Length } from 'class-validator';

const LONGEST = 2000;

/** What a person has to write: not empty, not blank, at most 2,000 characters. */
export function TrimmedText(): PropertyDecorator {
  return applyDecorators(
    ApiProperty({ minLength: 1, maxLength: LONGEST }),
    Transform(({ value }: { value: unknown }) => (typeof value === 'string' ? value.trim() : value)),
    IsString(),
    Length(1, LONGEST),
  );
}
