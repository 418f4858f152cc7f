import { applyDecorators, createParamDecorator, SetMetadata, type ExecutionContext } from '@nestjs/common';
import { ApiBody, ApiParam, ApiQuery } from '@nestjs/swagger';
import type { Request } from 'express';
import { z } from 'zod';
import { Refusal, RefusedError } from '../errors/refusal.js';
import { openApiSchema } from './openapi-schema.js';

export const TAKES_BODY = 'harkmoor:takes-body';
export const TAKES_PARAMS = 'harkmoor:takes-params';
export const TAKES_QUERY = 'harkmoor:takes-query';

const MISFITS_TOLD_MAX = 20;

/** Declares the body of a route, once, for checking and for OpenAPI; read it with `@Taken.body()`. */
export function TakesBody(schema: z.ZodType) {
  return applyDecorators(SetMetadata(TAKES_BODY, schema), ApiBody({ schema: openApiSchema(schema) }));
}

/** Declares the parameters in the path of a route. */
export function TakesParams(schema: z.ZodObject) {
  const parts = Object.entries(schema.shape).map(([name, part]) =>
    ApiParam({ name, schema: openApiSchema(part as z.ZodType) }),
  );
  return applyDecorators(SetMetadata(TAKES_PARAMS, schema), ...parts);
}

/** Declares the query of a route; its values arrive as text. */
export function TakesQuery(schema: z.ZodObject) {
  const parts = Object.entries(schema.shape).map(([name, part]) =>
    ApiQuery({
      name,
      required: !(part as z.ZodType).safeParse(undefined).success,
      schema: openApiSchema(part as z.ZodType),
    }),
  );
  return applyDecorators(SetMetadata(TAKES_QUERY, schema), ...parts);
}

/** Reads what the route declared; a misfit is refused with every place where it lies. */
function taken(key: string, pick: (request: Request) => unknown) {
  return createParamDecorator((_: unknown, context: ExecutionContext): unknown => {
    const schema = Reflect.getMetadata(key, context.getHandler()) as z.ZodType | undefined;
    if (!schema) throw new Error(`${context.getHandler().name} reads input that it does not declare`);
    return checkInput(schema, pick(context.switchToHttp().getRequest<Request>()));
  });
}

export const Taken = {
  body: taken(TAKES_BODY, (request) => request.body as unknown),
  params: taken(TAKES_PARAMS, (request) => request.params),
  query: taken(TAKES_QUERY, (request) => request.query),
};

/** The checked value, or a refusal that names each misfit by its path. */
export function checkInput<T>(schema: z.ZodType<T>, value: unknown): T {
  const checked = schema.safeParse(value);
  if (checked.success) return checked.data;
  const where = checked.error.issues.slice(0, MISFITS_TOLD_MAX).map((issue) => ({
    path: issue.path.map(String).join('.'),
    message: issue.message,
  }));
  throw new RefusedError(new Refusal('invalid', 'Some of what was sent does not fit.', where));
}
