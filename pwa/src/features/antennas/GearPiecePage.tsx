import type { StoredRecord } from '@harkmoor/sync-model/device/stored-record';
import type { FieldsByType } from '@harkmoor/sync-model/records/schemas';
import type { ComponentType } from 'react';
import { useParams } from 'react-router-dom';
import type { z } from 'zod';
import { PageFrame } from '../../design/page/PageFrame';
import { isNewId, paths } from '../../platform/paths';
import { isOwn, type Gear } from './data/gear';
import { useGearActs } from './data/use-gear-acts';
import { useGearWithUse } from './data/use-gear-with-use';
import { GearFormFrame } from './GearFormFrame';
import { NoSuchGear } from './NoSuchGear';
import { useGearForm } from './use-gear-form';

const BACK = { to: paths.antennas(), label: 'Antennas' };

type PieceType = 'receiver' | 'antenna';
type Values<T extends PieceType> = FieldsByType[T];

/** The form of one piece, as its fields are drawn by the piece's own component. */
export type PieceForm<T extends PieceType> = ReturnType<typeof useGearForm<Values<T>>>;

type Piece<T extends PieceType> = {
  readonly type: T;
  readonly schema: z.ZodType;
  /** The fields of a new one. */
  readonly fresh: Values<T>;
  readonly Fields: ComponentType<{ readonly form: PieceForm<T>; readonly isNew: boolean }>;
  readonly Read: ComponentType<{ readonly values: Values<T> }>;
};

/** One receiver or antenna: made, corrected, replaced or put away by its owner; read by others. */
export function GearPiecePage<T extends PieceType>({ piece }: { readonly piece: Piece<T> }) {
  const { id } = useParams();
  const found = useGearWithUse(piece.type, id);
  if (!found) {
    return (
      <PageFrame title="Antennas" back={BACK}>
        {null}
      </PageFrame>
    );
  }
  const { gear, isUsed } = found;
  const record = rowsOf(gear, piece.type).find((row) => row.id === id);
  if (!isNewId(id) && !record) return <NoSuchGear what={piece.type} />;
  return (
    <PageFrame title={record?.fields.name ?? `New ${piece.type}`} back={BACK}>
      {record && !isOwn(gear.log, record) ? (
        <piece.Read values={record.fields as Values<T>} />
      ) : (
        <PieceFormOf key={id} piece={piece} gear={gear} record={record ?? null} isUsed={isUsed} />
      )}
    </PageFrame>
  );
}

function rowsOf<T extends PieceType>(gear: Gear, type: T): readonly StoredRecord<T>[] {
  return (type === 'receiver' ? gear.receivers : gear.antennas) as readonly StoredRecord<T>[];
}

type PieceFormProps<T extends PieceType> = {
  readonly piece: Piece<T>;
  readonly gear: Gear;
  readonly record: StoredRecord<T> | null;
  readonly isUsed: boolean;
};

function PieceFormOf<T extends PieceType>({ piece, gear, record, isUsed }: PieceFormProps<T>) {
  const start = (record?.fields ?? piece.fresh) as Values<T>;
  const form = useGearForm<Values<T>>(start, piece.schema);
  const acts = useGearActs(gear.log, piece.type, record?.id ?? null);
  return (
    <GearFormFrame
      errors={form.errors}
      isDirty={form.isDirty}
      isFaulty={form.isFaulty}
      asksHow={isUsed}
      isRetired={start.retiredAt !== null}
      onPutAway={acts.putAway}
      onTakeBack={acts.takeBack}
      onSave={(how) => acts.save(how, form.values)}
    >
      <piece.Fields form={form} isNew={record === null} />
    </GearFormFrame>
  );
}
