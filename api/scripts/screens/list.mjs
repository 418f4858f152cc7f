import { chooseFilters, chooseHours, openSetups, press, scorePad, typeFrequency } from './acts.mjs';

/**
 * Every screen that is looked at: { name, who, at, ready, act? }. `who` is a person of people.mjs; `at` an address, or a
 * function of the addresses found for that person; `ready` a selector or text to wait for; `act` puts it into a state.
 */
export const SCREENS = [
  screen('welcome', 'nobody', '/field', 'Start a log on this phone'),
  screen('sign-in', 'nobody', '/account/sign-in', 'Forgot the password'),
  screen('sign-in-faults', 'nobody', '/account/sign-in', 'Forgot the password', press('Sign in')),
  screen('sign-up', 'nobody', '/account/sign-up', 'Make the account'),
  screen('reset', 'nobody', '/account/reset', 'h1'),
  screen('confirm', 'nobody', '/account/confirm', 'h1'),
  screen('account-nobody', 'nobody', '/account', 'No log is open'),

  screen('field-first', 'guest', '/field', 'Start listening'),
  screen('logbook-empty', 'guest', '/logbook', 'No receptions yet'),
  screen('coverage-empty', 'guest', '/coverage', 'No coverage yet'),
  screen('antennas-empty', 'guest', '/antennas', 'No gear yet'),
  screen('sites-empty', 'guest', '/field/sites', 'No sites yet'),
  screen('targets-empty', 'guest', '/desk/target-lists', 'h1'),
  screen('sync-guest', 'guest', '/sync', 'On this phone only'),

  screen('field-start', 'member', '/field', 'Setups and gear'),
  screen('start-outing', 'member', '/field/start', 'Target list'),
  screen('sites', 'member', '/field/sites', 'Add a site'),
  screen('site', 'member', ({ site }) => site, 'h1'),
  screen('site-new', 'member', '/field/sites/new', 'Use my position'),
  screen('logbook', 'member', '/logbook', '.log-main a'),
  screen('logbook-filters', 'member', '/logbook', '.log-main a', press('Filter')),
  screen('reception', 'member', ({ reception }) => reception, 'Changes'),
  screen('bin', 'member', '/logbook?bin=1', 'h1'),
  screen('coverage', 'member', '/coverage', 'canvas'),
  screen('coverage-hours', 'member', '/coverage?hours=16-20', 'canvas'),
  screen('coverage-frequency', 'member', '/coverage', 'canvas', chooseFilters),
  screen('square', 'member', ({ square }) => square, 'Left out'),
  screen('square-hours', 'member', ({ square }) => square, 'Left out', chooseHours),
  screen('coverage-table', 'member', '/coverage/table', 'td'),
  screen('antennas', 'member', '/antennas', 'Add an antenna'),
  screen('antenna', 'member', ({ antenna }) => antenna, 'h1'),
  screen('antenna-new', 'member', '/antennas/antennas/new', 'Height above ground'),
  screen('antenna-faults', 'member', '/antennas/antennas/new', 'Height above ground', press('Save')),
  screen('receiver-new', 'member', '/antennas/receivers/new', 'Battery'),
  screen('setup-new', 'member', '/antennas/setups/new', 'Preamplifier'),
  screen('events', 'member', '/events', 'h1'),
  screen('account', 'member', '/account', 'Sign out on this phone'),
  screen('sign-out', 'member', '/account', 'Sign out on this phone', press('Sign out on this phone')),
  screen('clubs', 'member', '/account/clubs', 'Found the club'),
  screen('sync', 'member', '/sync', 'As a file'),
  screen('settings', 'member', '/settings', 'Left hand'),
  screen('unknown', 'member', '/no-such-page', 'h1'),

  screen('desk', 'admin', '/desk', 'h1'),
  screen('people', 'admin', '/desk/people', 'h1'),
  screen('target-lists', 'admin', '/desk/target-lists', 'h1'),
  screen('target-list', 'admin', ({ targetList }) => targetList, 'h1'),
  screen('target-import', 'admin', ({ targetList }) => targetList && `${targetList}/import`, 'h1'),
  screen('target-list-new', 'admin', '/desk/target-lists', 'h1', press('Add a list')),
  screen('target-new', 'admin', ({ targetList }) => targetList, 'h1', press('Add a target')),

  screen('field-running', 'walker', '/field', '.fd-rows'),
  screen('field-setups', 'walker', '/field', '.fd-rows', openSetups),
  screen('field-clock', 'walker', '/field', '.fd-rows', press(/Check$/)),
  screen('field-end', 'walker', '/field', '.fd-rows', press('End outing')),
  screen('frequency', 'walker', '/field/frequency', 'Clear', typeFrequency('6070')),
  screen('frequency-offers', 'walker', '/field/frequency', 'Clear', typeFrequency('49m')),
  screen('pad', 'walker', ({ pad }) => pad(), '.hm-pad', scorePad('4433')),
  screen('pad-empty', 'walker', ({ pad }) => pad(), '.hm-pad'),
  screen('rain-lock', 'walker', '/field', '.fd-rows', press('Lock the screen against rain')),
];

function screen(name, who, at, ready, act) {
  return { name, who, at: typeof at === 'function' ? at : () => at, ready, act };
}
