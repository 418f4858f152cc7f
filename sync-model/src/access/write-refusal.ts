import type { Refusal } from '../protocol/messages.js';
import type { Role } from '../records/member.js';
import type { WritableType } from '../records/record-types.js';

export type Writer = {
  readonly accountId: string;
  readonly role: Role;
  readonly clubKind: 'club' | 'my-log';
};

/** A write as both sides see it: the phone before it offers a form, the server before it takes a change. */
export type Write = {
  readonly type: WritableType;
  /** Null where the record is new. */
  readonly ownerId: string | null;
  readonly changed: Readonly<Record<string, unknown>>;
  /** For target lists and targets: the list as stored, or as made in the same change. */
  readonly list?: { readonly ownerId: string; readonly publishedAt: number | null };
};

const MAY_PUBLISH: readonly Role[] = ['organizer', 'admin'];

/** Null where the writer may do it; otherwise why not, in words for a person. Roles are asked at each request. */
export function writeRefusal(writer: Writer, write: Write): Refusal | null {
  if (write.type === 'site-fix' && writer.clubKind !== 'my-log') {
    return refuse('An exact position is kept in My log only.');
  }
  if (write.type === 'target-list' || write.type === 'target') return listRefusal(writer, write);
  if (write.ownerId !== null && write.ownerId !== writer.accountId) {
    return refuse('Only its owner may change this record.');
  }
  return null;
}

function listRefusal(writer: Writer, write: Write): Refusal | null {
  const publishes =
    write.type === 'target-list' && 'publishedAt' in write.changed && write.changed.publishedAt !== null;
  const isPublished = write.list !== undefined && write.list.publishedAt !== null;
  if ((publishes || isPublished) && writer.clubKind === 'club' && !MAY_PUBLISH.includes(writer.role)) {
    return refuse('Published target lists are changed by organizers.');
  }
  const owner = write.list?.ownerId ?? write.ownerId;
  if (!isPublished && owner !== null && owner !== undefined && owner !== writer.accountId) {
    return refuse('A draft is changed by its owner.');
  }
  return null;
}

function refuse(message: string): Refusal {
  return { code: 'forbidden', message };
}
