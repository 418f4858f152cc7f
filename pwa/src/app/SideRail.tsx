import { Link, useLocation } from 'react-router-dom';
import { paths, SECTIONS, sectionOf } from '../platform/paths';
import { useSlots } from '../design/slots/slots';
import { useMayUseDesk } from './use-may-use-desk';

/** The rail of a laptop: the sections, the Desk for those who have one, and at its foot lamp, club and account. */
export function SideRail() {
  const { SyncLamp, AccountBadge, ClubName } = useSlots();
  const here = sectionOf(useLocation().pathname);
  const mayUseDesk = useMayUseDesk();
  return (
    <aside className="rail" aria-label="Harkmoor">
      <div className="rail-name">Harkmoor</div>
      <nav aria-label="Sections">
        {SECTIONS.map((section) => (
          <RailLink
            key={section.name}
            to={section.path}
            isHere={here === section.name}
            label={section.label}
          />
        ))}
        {mayUseDesk ? <RailLink to={paths.desk()} isHere={here === 'desk'} label="Desk" /> : null}
      </nav>
      <div className="rail-foot">
        <SyncLamp />
        <div className="rail-club">
          <ClubName />
          <AccountBadge />
        </div>
      </div>
    </aside>
  );
}

function RailLink(props: { readonly to: string; readonly isHere: boolean; readonly label: string }) {
  return (
    <Link to={props.to} className="rail-link" aria-current={props.isHere ? 'page' : undefined}>
      {props.label}
    </Link>
  );
}
