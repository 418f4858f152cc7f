import { useOfflineReady } from '../../../platform/offline-ready';

/** "Ready without signal", said only when each file was found on the phone. */
export function ReadyLine() {
  const readiness = useOfflineReady();
  return (
    <p className={readiness.kind === 'ready' ? 'fd-ready fd-ready-yes' : 'fd-ready'} role="status">
      {words()}
    </p>
  );

  function words(): string {
    switch (readiness.kind) {
      case 'ready':
        return '✓ Ready without signal: the application and the map are on this phone, with your lists.';
      case 'incomplete':
        return `Not ready without signal yet: ${readiness.missing} of ${readiness.files} files are still to come.`;
      case 'cannot':
        return 'This browser cannot keep the application. What you log stays here, but a reload needs signal.';
      case 'checking':
        return 'Looking whether all is on this phone…';
    }
  }
}
