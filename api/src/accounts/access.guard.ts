import { Injectable, type ExecutionContext } from '@nestjs/common';
import { Reflector } from '@nestjs/core';
import { AuthGuard } from '@nestjs/passport';
import { IS_PUBLIC } from '../platform/access/public.js';
import { Refusal, RefusedError } from '../platform/errors/refusal.js';

/** Stands before every route: without `@Public()` a route is closed to people who are not signed in. */
@Injectable()
export class AccessGuard extends AuthGuard('jwt') {
  constructor(private readonly reflector: Reflector) {
    super();
  }

  override canActivate(context: ExecutionContext) {
    const isPublic = this.reflector.getAllAndOverride<boolean>(IS_PUBLIC, [
      context.getHandler(),
      context.getClass(),
    ]);
    return isPublic ? true : super.canActivate(context);
  }

  override handleRequest<T>(error: unknown, user: T | false | null): T {
    if (error instanceof Error) throw error;
    if (!user) throw new RefusedError(new Refusal('unauthenticated', 'Sign in first.'));
    return user;
  }
}
