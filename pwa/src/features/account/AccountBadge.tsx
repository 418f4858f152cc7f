import { Badge } from '../../design/page/Badge';
import { paths } from '../../platform/paths';
import { useAccount } from './data/use-account';

/** The round badge with the person's initials; leads to the account. */
export function AccountBadge() {
  const view = useAccount();
  if (view.kind !== 'account')
    return <Badge to={paths.account()} initials="" label="Account: no sign-in yet" />;
  const { name } = view.account;
  return <Badge to={paths.account()} initials={initialsOf(name)} label={`Account of ${name}`} />;
}

/** First letters of the first and the last word; two letters of a single word. */
export function initialsOf(name: string): string {
  const words = name.trim().split(/\s+/);
  const [first = '', last] = [words[0], words.length > 1 ? words.at(-1) : undefined];
  const letters = last ? [...first][0]! + [...last][0]! : [...first].slice(0, 2).join('');
  return letters.toLocaleUpperCase('en');
}
