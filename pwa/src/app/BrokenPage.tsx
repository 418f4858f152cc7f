import { Button } from '../design/button/Button';
import { ErrorState } from '../design/states/ErrorState';
import { PageFrame } from '../design/page/PageFrame';

/** What stands in place of a screen that stopped: what is safe, and what to do. */
export function BrokenPage({ error }: { readonly error: Error }) {
  const isMissing = isMissingPart(error);
  return (
    <PageFrame title={isMissing ? 'This screen is not on the phone yet' : 'This screen stopped'}>
      <ErrorState
        title={isMissing ? 'A part of the application is missing' : 'Nothing logged is lost'}
        sentence={
          isMissing
            ? 'It is fetched once, with signal. Everything you logged is safe on this phone. Open it again when there is signal.'
            : 'Everything you saved is on this phone, and a draft is kept as you left it. Open the screen again; if it stops once more, write down the line below.'
        }
        detail={isMissing ? undefined : error.message}
        action={<Button onClick={() => location.reload()}>Open again</Button>}
      />
    </PageFrame>
  );
}

/** A lazily loaded file could not be fetched; browsers word it differently and give it no code. */
function isMissingPart(error: Error): boolean {
  return /dynamically imported module|importing a module script failed|error loading dynamically|preload css/i.test(
    error.message,
  );
}
