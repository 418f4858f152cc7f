import { Link } from 'react-router-dom';
import './badge.css';

type BadgeProps = {
  readonly to: string;
  /** One to three letters; a plain figure of a person where there is no name yet. */
  readonly initials: string;
  /** What a screen reader says, with the person's name where it is known. */
  readonly label: string;
};

/** The round badge at the top right: account, club, sync and settings behind it. */
export function Badge({ to, initials, label }: BadgeProps) {
  return (
    <Link to={to} className="hm-badge" aria-label={initials === '' ? label : `${initials}, ${label}`}>
      <span aria-hidden="true">{initials === '' ? <PersonMark /> : initials}</span>
    </Link>
  );
}

function PersonMark() {
  return (
    <svg width="18" height="18" viewBox="0 0 18 18" fill="none" stroke="currentColor" strokeWidth="2">
      <circle cx="9" cy="6" r="3" />
      <path d="M3 16c.6-3.4 3-5 6-5s5.4 1.6 6 5" strokeLinecap="round" />
    </svg>
  );
}
