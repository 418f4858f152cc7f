import { ButtonLink } from '../../../design/button/ButtonLink';
import { RowLink } from '../../../design/layout/RowLink';
import { Section } from '../../../design/layout/Section';
import { PageFrame } from '../../../design/page/PageFrame';
import { EmptyState } from '../../../design/states/EmptyState';
import { paths } from '../../../platform/paths';
import { useSiteCounts, useSiteRows, type SiteRow } from '../data/site-record';
import { ENVIRONMENT_WORDS, placeText } from './site-words';

/** The places of the club: one's own, those that others let everybody use, and the retired. */
export function SitesPage() {
  const rows = useSiteRows();
  return (
    <PageFrame
      title="Sites"
      back={{ to: paths.field(), label: 'Field' }}
      actions={
        <ButtonLink to={paths.newSite()} look="quiet">
          Add a site
        </ButtonLink>
      }
    >
      {rows?.length === 0 ? (
        <EmptyState
          title="No sites yet"
          sentence="A site is a named place to listen from. Others see a square of it, never the exact point, unless you say so."
          action={<ButtonLink to={paths.newSite()}>Add a site</ButtonLink>}
        />
      ) : null}
      {rows ? <SiteLists rows={rows} /> : null}
    </PageFrame>
  );
}

function SiteLists({ rows }: { readonly rows: readonly SiteRow[] }) {
  const inUse = rows.filter((row) => row.site.retiredAt === null);
  return (
    <>
      <SiteList title="Yours" rows={inUse.filter((row) => row.isOwn)} />
      <SiteList title="Of others" rows={inUse.filter((row) => !row.isOwn)} />
      <SiteList title="Retired" rows={rows.filter((row) => row.site.retiredAt !== null)} />
    </>
  );
}

function SiteList({ title, rows }: { readonly title: string; readonly rows: readonly SiteRow[] }) {
  const counts = useSiteCounts(rows.map((row) => row.id));
  if (rows.length === 0) return null;
  return (
    <Section title={title}>
      {rows.map(({ id, site, isOwn, ownerName }) => (
        <RowLink
          key={id}
          to={paths.site(id)}
          name={site.name}
          note={`${placeText(site.place)} · ${ENVIRONMENT_WORDS[site.environment]}${isOwn ? '' : ` · ${ownerName}’s`}`}
          aside={<span className="num">{countText(counts.get(id) ?? 0)}</span>}
        />
      ))}
    </Section>
  );
}

function countText(count: number): string {
  return count === 1 ? '1 entry' : `${count} entries`;
}
