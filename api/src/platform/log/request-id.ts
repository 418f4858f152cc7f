import type { Response } from 'express';

export const REQUEST_ID_HEADER = 'X-Request-Id';

/** The id that the request log gave to the request of this answer. */
export function requestIdOf(response: Response): string {
  const id = response.getHeader(REQUEST_ID_HEADER);
  return typeof id === 'string' ? id : 'unknown';
}
