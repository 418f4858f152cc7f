import { useParams } from 'react-router-dom';
import { ButtonLink } from '../../design/button/ButtonLink';
import { PageFrame } from '../../design/page/PageFrame';
import { EmptyState } from '../../design/states/EmptyState';
import { paths } from '../../platform/paths';
import { useReception } from './data/use-reception';
import { ReceptionView } from './record/ReceptionView';
import { receptionTitle } from './record/title-words';

const BACK = { to: paths.logbook(), label: 'Logbook' };

/** Everything that is known of one reception. */
export function ReceptionPage() {
  const { id } = useParams();
  const held = useReception(id);
  if (held === undefined) {
    return (
      <PageFrame title="Reception" back={BACK}>
        {null}
      </PageFrame>
    );
  }
  if (held === null) {
    return (
      <PageFrame title="Reception" back={BACK}>
        <EmptyState
          title="Not on this device"
          sentence="This reception is not in the log that is shown. It may belong to another club of yours, or its values were blanked after 30 days in the bin."
          action={<ButtonLink to={paths.logbook()}>To the logbook</ButtonLink>}
        />
      </PageFrame>
    );
  }
  const { title, subtitle } = receptionTitle(held);
  return (
    <PageFrame title={title} subtitle={<span className="num">{subtitle}</span>} back={BACK}>
      <ReceptionView key={id} held={held} />
    </PageFrame>
  );
}
