// @vitest-environment jsdom
import { cleanup, render, screen, within } from '@testing-library/react';
import userEvent from '@testing-library/user-event';
import { Dexie } from 'dexie';
import { MemoryRouter, Route, Routes, useLocation } from 'react-router-dom';
import type { ReactNode } from 'react';
import { afterEach, beforeEach, expect, it, vi } from 'vitest';
import { NoticeProvider } from '../../design/notice/notices';
import { ActiveLogProvider, useActiveLogState } from '../../store/active-log';
import type { OpenLog } from '../../store/open-log';
import { aReception, aSite, openTestGuestLog } from '../../store/test-log';
import { rememberOpenLog } from '../../store/this-device';
import { LogbookPage } from './LogbookPage';
import { ReceptionPage } from './ReceptionPage';

const AT = Date.UTC(2026, 10, 12, 18, 43);
const WAIT = { timeout: 5000 };
let log: OpenLog;

beforeEach(async () => {
  // nothing is laid out here: the list is told that it has room, and that the screen is a phone's
  vi.spyOn(HTMLElement.prototype, 'offsetHeight', 'get').mockReturnValue(700);
  vi.spyOn(HTMLElement.prototype, 'offsetWidth', 'get').mockReturnValue(390);
  window.matchMedia = ((media: string) => ({
    ...{ media, matches: false, addEventListener: () => undefined, removeEventListener: () => undefined },
  })) as never;
  log = await openTestGuestLog();
  rememberOpenLog('guest');
});

afterEach(async () => {
  cleanup();
  log.database.close();
  vi.restoreAllMocks();
  localStorage.clear();
  for (const name of await Dexie.getDatabaseNames()) await Dexie.delete(name);
});

function Address() {
  const { pathname, search } = useLocation();
  return <output aria-label="address">{pathname + search}</output>;
}

function show(path: string) {
  render(
    <ActiveLogProvider>
      <NoticeProvider>
        <MemoryRouter initialEntries={[path]}>
          <Routes>
            <Route path="/logbook" element={<Opened page={<LogbookPage />} />} />
            <Route path="/logbook/:id" element={<Opened page={<ReceptionPage />} />} />
          </Routes>
          <Address />
        </MemoryRouter>
      </NoticeProvider>
    </ActiveLogProvider>,
  );
}

function Opened({ page }: { readonly page: ReactNode }) {
  const state = useActiveLogState();
  return state.kind === 'open' ? page : null;
}

async function twoEntries() {
  const site = await log.writer.create('site', aSite());
  const named = { siteId: site.id, deviceAt: AT };
  const first = await log.writer.create('reception', aReception({ ...named, stationName: 'Radio Lindholt' }));
  await log.writer.create(
    'reception',
    aReception({ ...named, stationName: 'Tessel Overseas', outcome: 'nil', sinpo: null, nilReason: 'noise' }),
  );
  return first.id;
}

it('should say what to do where nothing is logged yet', async () => {
  show('/logbook');
  expect(await screen.findByRole('heading', { name: 'No receptions yet' }, WAIT)).toBeTruthy();
  expect(screen.getByRole('link', { name: 'To Field' }).getAttribute('href')).toBe('/field');
});

it('should show entries by day and site with their outcome and state, and keep a search in the address', async () => {
  await twoEntries();
  show('/logbook');
  const row = await screen.findByRole('link', { name: /Radio Lindholt/ }, WAIT);
  expect(row.textContent).toContain('44333');
  expect(row.textContent).toContain('Only here');
  expect(screen.getByRole('link', { name: /Tessel Overseas/ }).textContent).toContain('Nil, noise');
  expect(screen.getByRole('heading', { name: /12 Nov 2026 · Ravnklit dune/ })).toBeTruthy();
  await userEvent.type(screen.getByRole('searchbox'), 'tess');
  expect(await screen.findByText('1 of 2 receptions', {}, WAIT)).toBeTruthy();
  expect(screen.queryByRole('link', { name: /Radio Lindholt/ })).toBeNull();
  await vi.waitFor(() => expect(screen.getByLabelText('address').textContent).toBe('/logbook?q=tess'), WAIT);
});

it('should take a filter from the address, and take it off with one tap', async () => {
  await twoEntries();
  show('/logbook?outcome=nil');
  await screen.findByRole('link', { name: /Tessel Overseas/ }, WAIT);
  expect(screen.queryByRole('link', { name: /Radio Lindholt/ })).toBeNull();
  await userEvent.click(screen.getByRole('button', { name: 'Take off Nil' }));
  expect(await screen.findByRole('link', { name: /Radio Lindholt/ }, WAIT)).toBeTruthy();
  expect(screen.getByLabelText('address').textContent).toBe('/logbook');
});

it('should delete an entry into the bin, and restore it from there', async () => {
  const id = await twoEntries();
  show(`/logbook/${id}`);
  await userEvent.click(await screen.findByRole('button', { name: 'Delete' }, WAIT));
  expect(await screen.findByText(/In the bin since/, {}, WAIT)).toBeTruthy();
  cleanup();
  show('/logbook?bin=1');
  const row = await screen.findByRole('link', { name: /Radio Lindholt/ }, WAIT);
  expect(screen.queryByRole('link', { name: /Tessel Overseas/ })).toBeNull();
  await userEvent.click(row);
  await userEvent.click(await screen.findByRole('button', { name: 'Restore' }, WAIT));
  expect(await screen.findByRole('button', { name: 'Delete' }, WAIT)).toBeTruthy();
});

it('should put back a value that met another one, as an ordinary edit with an undo', async () => {
  const id = await twoEntries();
  const stamp = '019a00000000000000000000';
  await log.database.recordTable('history').put({
    ...{ clubId: log.clubId, type: 'history', id: 'h1', ownerId: null, seq: 9, at: stamp },
    fields: {
      ...{ deleted: false, recordType: 'reception', recordId: id, field: 'remarks', byId: '', clash: true },
      ...{ replaced: { value: 'faint carrier', stamp }, kept: { value: null, stamp } },
    },
  });
  show(`/logbook/${id}`);
  await userEvent.click(await screen.findByRole('button', { name: /Put back Remarks/ }, WAIT));
  expect(await screen.findByText('faint carrier', {}, WAIT)).toBeTruthy();
  expect((await log.database.recordTable('reception').get([log.clubId, id]))?.fields.remarks).toBe(
    'faint carrier',
  );
  await userEvent.click(
    within(await screen.findByText('Remarks put back').then((e) => e.parentElement!)).getByRole('button'),
  );
  await vi.waitFor(async () => {
    expect((await log.database.recordTable('reception').get([log.clubId, id]))?.fields.remarks).toBeNull();
  }, WAIT);
});

it('should be read-only where the entry is another’s', async () => {
  const id = await twoEntries();
  await log.database.recordTable('reception').update([log.clubId, id], { ownerId: 'someone' });
  show(`/logbook/${id}`);
  expect(await screen.findByText(/made this entry and alone may change it/, {}, WAIT)).toBeTruthy();
  expect(screen.queryByRole('button', { name: 'Delete' })).toBeNull();
  expect(screen.queryByRole('link', { name: 'Edit' })).toBeNull();
});
