import { Controller, Sse, type MessageEvent } from '@nestjs/common';
import { ApiBearerAuth, ApiProduces, ApiTags } from '@nestjs/swagger';
import {
  connect,
  endWith,
  ignoreElements,
  interval,
  map,
  merge,
  takeUntil,
  timer,
  type Observable,
} from 'rxjs';
import { SignedIn, type SignedInAs } from '../../platform/access/signed-in.js';
import { Answers } from '../../platform/openapi/openapi-schema.js';
import { ClubNotices } from './club-notices.js';

/** Shorter than the idle time after which proxies and mobile networks commonly cut a connection (common practice, no source). */
const BEAT_MS = 25_000;
/** Then the phone asks again with its token, so the end of a session holds here at the latest after so long. */
const STREAM_MS_MAX = 5 * 60_000;

/** The live half of sync: says that there is something, never what. */
@ApiTags('sync')
@ApiBearerAuth()
@Controller('sync')
export class NoticesController {
  constructor(private readonly clubNotices: ClubNotices) {}

  @Sse('notices')
  @ApiProduces('text/event-stream')
  @Answers(200, 'A stream of events `seq` with a club and where its feed stands, and of events `beat`')
  notices(@SignedIn() { accountId }: SignedInAs): Observable<MessageEvent> {
    const beats = interval(BEAT_MS).pipe(map(() => ({ type: 'beat', data: '{}' })));
    return this.clubNotices.of(accountId).pipe(
      map((data) => ({ type: 'seq', data })),
      // the beats end with the notices, so that the stream does
      connect((notices) => merge(notices, beats.pipe(takeUntil(endOf(notices))))),
      takeUntil(timer(STREAM_MS_MAX)),
    );
  }
}

function endOf(source: Observable<unknown>): Observable<null> {
  return source.pipe(ignoreElements(), endWith(null));
}
