import { useCallback, useMemo, useRef } from 'react';
import { useLocation, useNavigate } from 'react-router-dom';
import { PATTERNS, paths } from '../../../platform/paths';
import type { LogFilter } from '../index/log-filter';
import { filterQuery, readFilter, readOpenId } from './filter-query';

export type LogPlace = {
  readonly filter: LogFilter;
  /** The reception that stands open beside the list. */
  readonly openId: string | null;
  readonly change: (filter: Partial<LogFilter>) => void;
  /** The address of this view with a reception open beside it. */
  readonly withOpen: (id: string | null) => string;
};

/** What the address of the logbook tells. The page stays mounted when it is left, so it goes by its own last address. */
export function useLogFilter(): LogPlace {
  const location = useLocation();
  const navigate = useNavigate();
  const own = useRef('');
  if (location.pathname === PATTERNS.logbook) own.current = location.search;
  const search = own.current;
  const filter = useMemo(() => readFilter(search), [search]);
  const openId = readOpenId(search);
  const change = useCallback(
    (changed: Partial<LogFilter>) => {
      const query = {
        ...filterQuery({ ...readFilter(own.current), ...changed }),
        open: readOpenId(own.current),
      };
      navigate(paths.logbook(query), { replace: true });
    },
    [navigate],
  );
  const withOpen = useCallback(
    (id: string | null) => paths.logbook({ ...filterQuery(filter), open: id }),
    [filter],
  );
  return { filter, openId, change, withOpen };
}
