import { ButtonLink } from '../design/button/ButtonLink';
import { EmptyState } from '../design/states/EmptyState';
import { PageFrame } from '../design/page/PageFrame';
import { paths } from '../platform/paths';

/** An address that leads nowhere. */
export function UnknownPage() {
  return (
    <PageFrame title="No such page">
      <EmptyState
        title="There is nothing at this address"
        sentence="The link may be old or mistyped. What you logged is not touched by this."
        action={<ButtonLink to={paths.field()}>Go to Field</ButtonLink>}
      />
    </PageFrame>
  );
}
