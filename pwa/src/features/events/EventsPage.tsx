import { ButtonLink } from '../../design/button/ButtonLink';
import { PageFrame } from '../../design/page/PageFrame';
import { EmptyState } from '../../design/states/EmptyState';
import { paths } from '../../platform/paths';

/** What is on and coming. Events are not made yet by this version; the page says so and what to do meanwhile. */
export function EventsPage() {
  return (
    <PageFrame title="Events">
      <EmptyState
        title="No listening events"
        sentence="A listening event gives everybody one list and one span of time. This version keeps none yet; what you log now with a target list is the same evidence."
        action={<ButtonLink to={paths.targetLists()}>Go to Target lists</ButtonLink>}
      />
    </PageFrame>
  );
}
