import { SetMetadata } from '@nestjs/common';

export const IS_PUBLIC = 'harkmoor:public';

/** Opens a route to people who are not signed in; every other route is closed to them. */
export function Public() {
  return SetMetadata(IS_PUBLIC, true);
}
