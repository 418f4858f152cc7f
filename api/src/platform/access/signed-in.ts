import { createParamDecorator, type ExecutionContext } from '@nestjs/common';
import type { Request } from 'express';

/** Who makes a request, as the database says at this request. */
export type SignedInAs = {
  readonly accountId: string;
  /** The session of the device that asks. */
  readonly sessionId: string;
  readonly name: string;
  /** Whether the mail address was confirmed: asked for founding and inviting, never for logging. */
  readonly isConfirmed: boolean;
};

/** Hands the signed-in account to a route; only for routes that are not public. */
export const SignedIn = createParamDecorator((_: unknown, context: ExecutionContext): SignedInAs => {
  const { user } = context.switchToHttp().getRequest<Request & { user?: SignedInAs }>();
  if (!user) throw new Error(`${context.getHandler().name} is public and asks who is signed in`);
  return user;
});
