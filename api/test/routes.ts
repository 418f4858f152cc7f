import type { INestApplication, RequestMethod as Method } from '@nestjs/common';
import { RequestMethod } from '@nestjs/common';
import { METHOD_METADATA, PATH_METADATA } from '@nestjs/common/constants.js';
import { ModulesContainer } from '@nestjs/core';
import type { z } from 'zod';
import { IS_PUBLIC } from '../src/platform/access/public.js';
import { ANSWERS } from '../src/platform/openapi/openapi-schema.js';
import { TAKES_BODY, TAKES_PARAMS, TAKES_QUERY } from '../src/platform/openapi/takes.js';

/** A route of the running application with what it declares of itself. */
export type Route = {
  /** As in `GET /api/clubs/:clubId`. */
  readonly name: string;
  readonly method: string;
  readonly path: string;
  readonly isPublic: boolean;
  readonly body?: z.ZodType;
  readonly params?: z.ZodObject;
  readonly query?: z.ZodObject;
  readonly answer?: { readonly status: number; readonly schema?: z.ZodType };
};

/** Every route that Nest serves, read from its modules. */
export function routesOf(app: INestApplication): Route[] {
  const controllers = [...app.get(ModulesContainer).values()].flatMap((module) => [
    ...module.controllers.values(),
  ]);
  const routes = controllers.flatMap(({ metatype }) => (metatype ? routesOfController(metatype) : []));
  return routes.sort((a, b) => a.name.localeCompare(b.name));
}

// eslint-disable-next-line @typescript-eslint/no-unsafe-function-type -- what Nest calls a class
function routesOfController(controller: Function): Route[] {
  const prefix = String(Reflect.getMetadata(PATH_METADATA, controller));
  const prototype = controller.prototype as Record<string, object>;
  return Object.getOwnPropertyNames(prototype).flatMap((key) => {
    const handler = prototype[key]!;
    const method = Reflect.getMetadata(METHOD_METADATA, handler) as Method | undefined;
    if (method === undefined) return [];
    const path = joined('/api', prefix, String(Reflect.getMetadata(PATH_METADATA, handler)));
    const verb = RequestMethod[method]!;
    const declared = <T>(name: string) => Reflect.getMetadata(name, handler) as T;
    return [
      {
        name: `${verb} ${path}`,
        method: verb,
        path,
        isPublic: declared<boolean | undefined>(IS_PUBLIC) === true,
        body: declared<z.ZodType>(TAKES_BODY),
        params: declared<z.ZodObject>(TAKES_PARAMS),
        query: declared<z.ZodObject>(TAKES_QUERY),
        answer: declared<Route['answer']>(ANSWERS),
      },
    ];
  });
}

function joined(...parts: string[]): string {
  const path = parts
    .map((part) => part.replace(/^\/|\/$/g, ''))
    .filter((part) => part !== '')
    .join('/');
  return `/${path}`;
}
