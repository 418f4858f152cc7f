import { useEffect, useState } from 'react';
import { Button } from '../../design/button/Button';
import { Section } from '../../design/layout/Section';
import { isFineMapKept } from '../../platform/map-data';
import { useOfflineReady, type OfflineReadiness } from '../../platform/offline-ready';
import { askToPersist, storageState, type StorageState } from '../../platform/storage-persistence';
import { withUnit } from '../../platform/utc-text';

/** What of the application is on the device, and whether the browser has promised to keep it. */
export function OfflineSection() {
  const readiness = useOfflineReady();
  const [storage, setStorage] = useState<StorageState | null>(null);
  const [hasFineMap, setFineMap] = useState(false);
  useEffect(() => {
    void storageState().then(setStorage);
    void isFineMapKept().then(setFineMap);
  }, [readiness]);
  const keep = async (): Promise<void> => {
    await askToPersist();
    setStorage(await storageState());
  };
  return (
    <Section title="Without signal">
      <p>
        <strong>{readinessWords(readiness)}</strong>
      </p>
      <p className="soft small">
        {hasFineMap
          ? 'Map: coarse and fine, both on this device.'
          : 'Map: coarse on this device; the fine one comes with signal.'}
      </p>
      {storage ? <p className="soft small">{storageWords(storage)}</p> : null}
      {storage?.persisted === false ? (
        <Button look="quiet" onClick={() => void keep()}>
          Ask the browser to keep it
        </Button>
      ) : null}
    </Section>
  );
}

/** One sentence for each state; "ready" only when each file was found. */
export function readinessWords(readiness: OfflineReadiness): string {
  switch (readiness.kind) {
    case 'ready':
      return 'Ready without signal.';
    case 'incomplete':
      return `Not yet: ${readiness.missing} of ${readiness.files} files are still to come. Stay in signal a moment.`;
    case 'cannot':
      return 'This browser keeps no application without signal. Open it outside a private window, or in another browser.';
    case 'checking':
      return 'Being looked at…';
  }
}

function storageWords({ persisted, usedBytes }: StorageState): string {
  const used = usedBytes === null ? '' : `${withUnit(usedBytes / 1_000_000, 'MB', 1)} used. `;
  if (persisted === null) return `${used}The browser does not say whether it keeps the log.`;
  return persisted
    ? `${used}The browser has promised to keep the log.`
    : `${used}The browser may clear the log when the disk is full. Installing, or asking it, helps.`;
}
