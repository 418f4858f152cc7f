import { Section } from '../../design/layout/Section';
import { ChoiceChips } from '../../design/choice/ChoiceChips';
import { RowLink } from '../../design/layout/RowLink';
import { paths } from '../../platform/paths';
import { useAccount } from './data/use-account';
import { useKnownClubs } from './data/clubs';

/** Which of the account's clubs the screens show and new entries go to; works offline. */
export function ClubSwitch() {
  const view = useAccount();
  const clubs = useKnownClubs();
  if (view.kind !== 'account') return null;
  return (
    <Section title="Club">
      <ChoiceChips
        label="Club that is shown, and that new entries go to"
        options={clubs.map(({ clubId, card }) => ({
          value: clubId,
          label: card.demo ? `${card.name} (demo)` : card.name,
        }))}
        value={view.log.clubId}
        onChange={(clubId) => clubId !== null && void view.actions.showClub(clubId)}
      />
      <p className="account-line">
        {view.log.card.kind === 'my-log'
          ? 'My log is yours alone; nobody else sees it.'
          : `You are ${view.log.role === 'member' ? 'a member' : `an ${view.log.role}`} of ${view.log.card.name}.`}
      </p>
      <RowLink to={paths.clubs()} name="Found or join a club" />
    </Section>
  );
}
