import { ButtonLink } from '../../design/button/ButtonLink';
import { PageFrame } from '../../design/page/PageFrame';
import { EmptyState } from '../../design/states/EmptyState';
import { paths } from '../../platform/paths';

/** An address of gear that this phone does not hold. */
export function NoSuchGear({ what }: { readonly what: string }) {
  return (
    <PageFrame title={`No such ${what}`} back={{ to: paths.antennas(), label: 'Antennas' }}>
      <EmptyState
        title={`This phone holds no such ${what}`}
        sentence="It may be in another club, or not received yet."
        action={<ButtonLink to={paths.antennas()}>Go to Antennas</ButtonLink>}
      />
    </PageFrame>
  );
}
