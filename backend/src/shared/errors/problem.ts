import type { FieldError } from '@roothertz/common/parts';
import { applyDecorators } from '@nestjs/common';
import { ApiDefaultResponse, ApiExtraModels, ApiProperty, getSchemaPath } from '@nestjs/swagger';
import { type DomainError } from './domain-error.js';
import { ERROR_CODES, type ErrorCode } from './error-codes.js';

export const PROBLEM_TYPE = 'application/problem+json';

class ProblemFieldError implements FieldError {
  @ApiProperty({ description: 'Path of the field', example: 'conditions.band.upper' })
  field: string;

  @ApiProperty()
  message: string;
}

/** Problem details of RFC 9457. */
class Problem {
  @ApiProperty({ example: 'urn:roothertz:problem:request.invalid' })
  type: string;

  @ApiProperty()
  title: string;

  @ApiProperty()
  status: number;

  @ApiProperty()
  detail: string;

  @ApiProperty({ enum: Object.keys(ERROR_CODES), enumName: 'ErrorCode' })
  code: ErrorCode;

  @ApiProperty({ description: 'Finds this request in the server’s log.' })
  correlationId: string;

  @ApiProperty({ type: [ProblemFieldError], required: false })
  errors?: FieldError[];
}

export function toProblem({ code, detail, errors }: DomainError, correlationId: string): Problem {
  const { status, title } = ERROR_CODES[code];
  const type = `urn:roothertz:problem:${code}`;
  return { type, title, status, detail, code, correlationId, ...(errors && { errors }) };
}

/** Documents that a route answers with problem details when it can't serve the request. */
export function ApiProblem(): MethodDecorator {
  return applyDecorators(
    ApiExtraModels(Problem),
    ApiDefaultResponse({
      description: 'Problem details (RFC 9457)',
      content: { [PROBLEM_TYPE]: { schema: { $ref: getSchemaPath(Problem) } } },
    }),
  );
}
