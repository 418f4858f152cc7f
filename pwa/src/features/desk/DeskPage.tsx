import { RowLink } from '../../design/layout/RowLink';
import { PageFrame } from '../../design/page/PageFrame';
import { paths } from '../../platform/paths';

/** What organizers and admins do for the club. */
export function DeskPage() {
  return (
    <PageFrame title="Desk">
      <RowLink
        to={paths.targetLists()}
        name="Target lists"
        note="Make, import and publish what to listen for"
      />
      <RowLink to={paths.people()} name="People" note="Members, roles and the join code" />
    </PageFrame>
  );
}
