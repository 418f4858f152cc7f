import { Navigate, Route } from 'react-router-dom';
import { paths } from '../platform/paths';
import { LogGate } from './LogGate';
import { PageBoundary } from './PageBoundary';
import { ROUTED_PAGES } from './pages';
import { UnknownPage } from './UnknownPage';

/** The routes as elements: the Ionic outlet reads its direct children and takes no wrapper. */
export const ROUTES = [
  ...ROUTED_PAGES.map(({ name, pattern, Page }) => (
    <Route
      key={name}
      path={pattern}
      element={
        <PageBoundary>
          <LogGate page={name}>
            <Page />
          </LogGate>
        </PageBoundary>
      }
    />
  )),
  <Route key="start" path="/" element={<Navigate to={paths.field()} replace />} />,
  <Route key="unknown" path="*" element={<UnknownPage />} />,
];
