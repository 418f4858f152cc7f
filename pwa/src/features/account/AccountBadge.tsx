import { Badge } from '../../design/page/Badge';
import { paths } from '../../platform/paths';

/** The round badge; leads to the account. */
export function AccountBadge() {
  return <Badge to={paths.account()} initials="" label="Account" />;
}
