import { Button } from '../../design/button/Button';
import { Section } from '../../design/layout/Section';
import { askToInstall, useInstallOffer } from '../../platform/install-offer';

/** Offers to install, quietly and only here. Nothing where the browser has no such thing. */
export function InstallSection() {
  const offer = useInstallOffer();
  if (offer === 'none') return null;
  return (
    <Section title="On the home screen">
      {offer === 'installed' ? (
        <p>Installed: it opens like any other application, with or without signal.</p>
      ) : null}
      {offer === 'can-ask' ? (
        <>
          <p>Installed, it opens full screen and the browser keeps the log more surely.</p>
          <Button look="outline" onClick={() => void askToInstall()}>
            Install Harkmoor
          </Button>
        </>
      ) : null}
      {offer === 'by-hand' ? (
        <p>
          Open the share menu of the browser and choose <strong>Add to Home Screen</strong>. It then opens
          full screen, and the browser keeps the log more surely.
        </p>
      ) : null}
    </Section>
  );
}
