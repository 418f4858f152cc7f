import { applyDecorators } from '@nestjs/common';
import { ApiDefaultResponse, ApiResponse } from '@nestjs/swagger';
import { SetMetadata } from '@nestjs/common';
import { z } from 'zod';
import { errorAnswerSchema } from '../errors/refusal.js';

type OpenApiSchema = Exclude<
  Parameters<typeof ApiResponse>[0] extends infer T ? (T extends { schema: infer S } ? S : never) : never,
  undefined
>;

export const ANSWERS = 'harkmoor:answers';

/** The same zod schema as OpenAPI 3.0 says it. */
export function openApiSchema(schema: z.ZodType): OpenApiSchema {
  const json = z.toJSONSchema(schema, { target: 'openapi-3.0', unrepresentable: 'any', io: 'input' });
  delete json.$schema;
  return json as OpenApiSchema;
}

/** Declares what a route answers when it succeeds; each may also answer with an error. */
export function Answers(status: number, description: string, schema?: z.ZodType) {
  return applyDecorators(
    SetMetadata(ANSWERS, { status, schema }),
    ApiResponse({ status, description, ...(schema ? { schema: openApiSchema(schema) } : {}) }),
    ApiDefaultResponse({ description: 'A refusal', schema: openApiSchema(errorAnswerSchema) }),
  );
}
