import { applyDecorators } from '@nestjs/common';
import { ApiResponse } from '@nestjs/swagger';
import { Problem } from '../problem';

const WORDS: Record<number, string> = {
  400: 'The request is not well formed.',
  401: 'Not signed in.',
  403: 'The role does not allow it.',
  404: 'Not found.',
  409: 'Somebody else was quicker, or a step is missing.',
  422: 'A value does not fit, at its field.',
  429: 'Too many tries.',
};

/** Describes the errors of a route. */
export const ApiProblems = (...statuses: number[]) =>
  applyDecorators(
    ...statuses.map((status) =>
      ApiResponse({
        status,
        description: WORDS[status],
        content: {
          'application/problem+json': { schema: { $ref: '#/components/schemas/Problem' } },
        },
      }),
    ),
  );

/** Class kept so that the description holds the schema. */
export const PROBLEM_MODEL = Problem;
