import { useCallback, useRef } from 'react';
import { useLocation, useNavigate } from 'react-router-dom';
import { paths } from '../../../platform/paths';
import { readView, viewQuery, type CoverageView } from './coverage-view';

export type ChangeView = (change: Partial<CoverageView>) => void;

/**
 * The view that the address of this page tells, and the way to change it. A page stays mounted when it is left, so
 * it goes by the last address that was its own.
 */
export function useCoverageView(pathname: string): [CoverageView, ChangeView] {
  const location = useLocation();
  const navigate = useNavigate();
  const own = useRef({ search: '', view: readView('') });
  if (location.pathname === pathname && own.current.search !== location.search) {
    own.current = { search: location.search, view: readView(location.search) };
  }
  const { view } = own.current;
  const change = useCallback<ChangeView>(
    (changed) => {
      const query = new URLSearchParams(paths.coverage(viewQuery({ ...view, ...changed })).split('?')[1]);
      navigate({ pathname, search: query.toString() }, { replace: true });
    },
    [navigate, pathname, view],
  );
  return [view, change];
}
