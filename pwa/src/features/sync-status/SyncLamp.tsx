import { Link } from 'react-router-dom';
import { paths } from '../../platform/paths';

/** The state of sending; leads to the page of what waits. */
export function SyncLamp() {
  return <Link to={paths.sync()}>Sending</Link>;
}
