import type { StoredRecord } from '@harkmoor/sync-model/device/stored-record';
import { receptionFromTap, type TapSubject } from '@harkmoor/sync-model/records/reception-from-tap';
import {
  NO_OUTLINES,
  type OutlinedScores,
  type TouchedScores,
} from '@harkmoor/sync-model/records/score-draft';
import type { Mode } from '@harkmoor/sync-model/records/common-fields';
import type { Reception } from '@harkmoor/sync-model/records/reception';
import { frequencyText } from '@harkmoor/sync-model/radio/bands/frequency-text';
import { utcHourMinute } from '../../../platform/utc-text';
import type { OpenLog } from '../../../store/open-log';
import { carriedOf, outlinesOf, touchedOf } from './entry-scores';
import { readGear, setupsOf, type SetupChoice } from './gear';
import { readPadDraft, type PadValues } from './pad-drafts';
import { readOwnOutings } from './running-outing';

/** The address of a pad, read. Either an entry to edit, or a tap with what it was made on. */
export type PadAddress = {
  receptionId: string | null;
  draftId: string | null;
  targetId: string | null;
  frequencyHz: number | null;
  mode: Mode | null;
  means: 'round' | 'planned' | 'chance' | null;
  roundNo: number | null;
  atMs: number | null;
  againId: string | null;
  /** The address itself, kept with the draft. */
  path: string;
};

export type PadStart =
  | {
      kind: 'ready';
      base: Reception;
      outlined: OutlinedScores;
      values: PadValues;
      /** What the pad held when it was opened without a draft: what differs from it is unsaved work. */
      untouched: PadValues;
      targetName: string | null;
      setups: SetupChoice[];
    }
  /** Saved a moment before the phone died, or opened again from the history. */
  | { kind: 'saved' }
  | { kind: 'gone'; sentence: string };

export async function readPadStart(log: OpenLog, address: PadAddress): Promise<PadStart> {
  return address.receptionId === null ? startNew(log, address) : startEdit(log, address, address.receptionId);
}

async function startNew(log: OpenLog, address: PadAddress): Promise<PadStart> {
  const { draftId, atMs } = address;
  if (draftId === null || atMs === null) return gone('This address names no entry. Tap Heard in Field.');
  const receptions = log.database.recordTable('reception');
  if (await receptions.get([log.clubId, draftId])) return { kind: 'saved' };
  const draft = await readPadDraft(log, draftId);
  const outing = draft?.outingId
    ? await log.database.recordTable('outing').get([log.clubId, draft.outingId])
    : (await readOwnOutings(log, Date.now())).running;
  if (!outing) return gone('No outing runs. Start one in Field, then tap Heard.');
  const target = address.targetId
    ? await log.database.recordTable('target').get([log.clubId, address.targetId])
    : undefined;
  const subject = subjectOf(address, target);
  if (!subject) return gone('This target is no longer on this phone. Enter its frequency instead.');
  const before = address.againId ? await receptions.get([log.clubId, address.againId]) : undefined;
  const tap = {
    outcome: 'heard',
    subject,
    outingId: outing.id,
    outing: outing.fields,
    deviceAtMs: atMs,
  } as const;
  const base = againOf(receptionFromTap(tap), before?.fields);
  const outlined = before ? outlinesOf(before.fields) : NO_OUTLINES;
  const targetName = target?.fields.name ?? null;
  const untouched = valuesOf(base, {
    id: draftId,
    path: address.path,
    isEdit: false,
    targetName,
    touched: { sinpo: {} },
  });
  return {
    kind: 'ready',
    base,
    outlined,
    untouched,
    values: { ...untouched, ...draft },
    targetName,
    setups: await readSetups(log, base),
  };
}

async function startEdit(log: OpenLog, address: PadAddress, id: string): Promise<PadStart> {
  const entry = await log.database.recordTable('reception').get([log.clubId, id]);
  if (!entry || entry.fields.deleted) return gone('This entry is not in the log. It may lie in the bin.');
  if (entry.ownerId !== (log.account?.id ?? null)) return gone('Only who heard it may change an entry.');
  const base = entry.fields;
  const target = base.targetId
    ? await log.database.recordTable('target').get([log.clubId, base.targetId])
    : undefined;
  const targetName = target?.fields.name ?? null;
  const touched = touchedOf(base);
  const untouched = valuesOf(base, { id, path: address.path, isEdit: true, targetName, touched });
  const draft = await readPadDraft(log, id);
  const outlined = carriedOf(base);
  return {
    kind: 'ready',
    base,
    outlined,
    untouched,
    values: { ...untouched, ...draft },
    targetName,
    setups: await readSetups(log, base),
  };
}

/** What may have been used: the setups of the entry's outing, with the one that the entry names. */
async function readSetups(log: OpenLog, { outingId, setupId }: Reception): Promise<SetupChoice[]> {
  const outing = outingId ? await log.database.recordTable('outing').get([log.clubId, outingId]) : undefined;
  return setupsOf(await readGear(log), [...new Set([...(outing?.fields.setupIds ?? []), setupId])]);
}

function subjectOf(address: PadAddress, target: StoredRecord<'target'> | undefined): TapSubject | null {
  if (address.means === 'round') {
    if (!target) return null;
    return { kind: 'row', targetId: target.id, target: target.fields, roundNo: address.roundNo ?? 1 };
  }
  if (address.frequencyHz === null) return null;
  return {
    kind: 'frequency',
    dialHz: address.frequencyHz,
    mode: address.mode ?? 'AM',
    basis: address.means ?? 'planned',
    ...(target ? { target: { id: target.id, fields: target.fields } } : {}),
  };
}

/** *Same again* takes the tuning and the name over; the scores are outlines and no part of it. */
function againOf(made: Reception, before: Reception | undefined): Reception {
  if (!before) return made;
  const { tuning, stationName, identity, bandwidthHz } = before;
  return { ...made, tuning, stationName, identity, bandwidthHz };
}

function valuesOf(
  base: Reception,
  pad: { id: string; path: string; isEdit: boolean; targetName: string | null; touched: TouchedScores },
): PadValues {
  const name = base.stationName ?? pad.targetName;
  return {
    receptionId: pad.id,
    outingId: base.outingId,
    title: [frequencyText(base.tuning.dialHz), name, `${utcHourMinute(base.deviceAt)} UTC`]
      .filter(Boolean)
      .join(' · '),
    path: pad.path,
    isEdit: pad.isEdit,
    outcome: base.outcome,
    nilReason: base.nilReason,
    atMs: base.deviceAt,
    scores: pad.touched,
    rstParts: pad.touched.rst ?? {},
    mode: base.tuning.mode,
    dialHz: base.tuning.dialHz,
    setupId: base.setupId,
    identity: base.identity,
    stationName: base.stationName ?? '',
    remarks: base.remarks ?? '',
    programme: base.programme ?? [],
    programmeText: '',
    programmeAt: null,
  };
}

function gone(sentence: string): PadStart {
  return { kind: 'gone', sentence };
}
