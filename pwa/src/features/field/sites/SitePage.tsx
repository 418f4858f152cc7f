import { useState } from 'react';
import { useParams, useSearchParams } from 'react-router-dom';
import { PageFrame } from '../../../design/page/PageFrame';
import { EmptyState } from '../../../design/states/EmptyState';
import { ButtonLink } from '../../../design/button/ButtonLink';
import { isNewId, paths } from '../../../platform/paths';
import { useSite, type SiteView } from '../data/site-record';
import { SiteForm } from './SiteForm';
import { ENVIRONMENT_WORDS, placeSizeText } from './site-words';

const BACK = { to: paths.sites(), label: 'Sites' };
const BACK_TO_START = { to: paths.startOuting(), label: 'Start an outing' };

/** One site: its owner's form, or what others may read of it. */
export function SitePage() {
  const { id } = useParams();
  const [search] = useSearchParams();
  const [isForOuting] = useState(search.get('for') === 'outing');
  const view = useSite(isNewId(id) ? undefined : id);
  if (isNewId(id)) {
    return (
      <PageFrame title="New site" back={isForOuting ? BACK_TO_START : BACK}>
        <SiteForm view={null} isForOuting={isForOuting} />
      </PageFrame>
    );
  }
  if (view === undefined)
    return (
      <PageFrame title="Site" back={BACK}>
        {null}
      </PageFrame>
    );
  if (view === null) {
    return (
      <PageFrame title="No such site" back={BACK}>
        <EmptyState
          title="This phone holds no such site"
          sentence="It may be in another club, or not received yet."
          action={<ButtonLink to={paths.sites()}>Go to Sites</ButtonLink>}
        />
      </PageFrame>
    );
  }
  return (
    <PageFrame title={view.site.fields.name} back={BACK}>
      {view.isOwn ? <SiteForm key={view.site.id} view={view} /> : <OthersSite view={view} />}
    </PageFrame>
  );
}

function OthersSite({ view }: { readonly view: SiteView }) {
  const { place, environment, notes } = view.site.fields;
  return (
    <>
      <p className="num">{placeSizeText(place)}</p>
      <p>{ENVIRONMENT_WORDS[environment]} noise surroundings</p>
      {notes ? <p>{notes}</p> : null}
      <p className="small">{view.ownerName ?? 'A former member'}’s site. Only its owner may change it.</p>
    </>
  );
}
