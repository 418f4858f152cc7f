import { useAccount } from './data/use-account';
import './account.css';

/** The club whose log is open, and that it is a demo where it is one. */
export function ClubName() {
  const view = useAccount();
  if (view.kind !== 'account' && view.kind !== 'guest') return null;
  const { card } = view.log;
  return (
    <div className="club-name">
      {card.name}
      {card.demo ? <div>demo club, invented</div> : null}
    </div>
  );
}
