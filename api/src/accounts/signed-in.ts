import { createParamDecorator, type ExecutionContext } from '@nestjs/common';
import type { Request } from 'express';

/** Who makes a request: an account and the session of its device. */
export type SignedInAs = { readonly accountId: string; readonly sessionId: string };

/** Hands the signed-in account to a route; only for routes that are not public. */
export const SignedIn = createParamDecorator((_: unknown, context: ExecutionContext): SignedInAs => {
  const { user } = context.switchToHttp().getRequest<Request & { user?: SignedInAs }>();
  if (!user) throw new Error(`${context.getHandler().name} is public and asks who is signed in`);
  return user;
});
