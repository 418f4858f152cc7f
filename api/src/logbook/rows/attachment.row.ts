import { Entity, Property } from '@mikro-orm/core';
import type { Attachment as Fields } from '@harkmoor/sync-model/records/attachment';
import { instant, optional, smallWholeNumber, text, uuid, word } from '../../sync/column-types.js';
import { RecordRow } from './record.row.js';

/** A photo or a sound of a reception; the bytes are kept apart. */
@Entity({ tableName: 'attachment' })
export class AttachmentRow extends RecordRow implements Fields {
  @Property(uuid())
  receptionId!: Fields['receptionId'];

  @Property(word())
  kind!: Fields['kind'];

  @Property(smallWholeNumber())
  bytes!: Fields['bytes'];

  @Property(word())
  sha256!: Fields['sha256'];

  @Property(optional(instant()))
  takenAt!: Fields['takenAt'];

  @Property(optional(text(200)))
  caption!: Fields['caption'];
}
