import { loadConfiguration } from '../../src/platform/configuration/configuration.js';
import { networkOf } from '../../src/platform/http/network-of.js';

const ENOUGH = {
  DATABASE_URL: 'postgresql://harkmoor@127.0.0.1:5432/harkmoor',
  JWT_SECRET: 'a secret of more than thirty-two characters',
  MAIL_URL: 'smtp://127.0.0.1:1025',
  PUBLIC_URL: 'http://127.0.0.1:3000/',
};

test('should start with few settings', () => {
  const configuration = loadConfiguration(ENOUGH);
  expect(configuration).toMatchObject({ port: 3000, host: '127.0.0.1', publicUrl: 'http://127.0.0.1:3000' });
  expect(configuration.pwaDir).toMatch(/\/pwa\/dist$/);
});

test('should name everything that is missing or wrong at once, and no secret', () => {
  const load = () => loadConfiguration({ ...ENOUGH, JWT_SECRET: 'short', MAIL_URL: '', PORT: 'eighty' });
  expect(load).toThrow(
    /^The configuration is not usable:\n {2}PORT: .+\n {2}JWT_SECRET: .+\n {2}MAIL_URL: is not set$/,
  );
  expect(load).not.toThrow(/short|eighty/);
});

// RFC 4291 section 2.2 for the forms; RFC 6177 for the /64
test.each([
  ['192.0.2.7', '192.0.2.7'],
  ['::ffff:192.0.2.7', '192.0.2.7'],
  ['2001:db8:1:2:3:4:5:6', '2001:db8:1:2::/64'],
  ['2001:0DB8:0001:0002::1', '2001:db8:1:2::/64'],
  ['2001:db8::1', '2001:db8:0:0::/64'],
  ['::1', '0:0:0:0::/64'],
  ['fe80::1%eth0', 'fe80:0:0:0::/64'],
])('should count %s as %s', (address, network) => {
  expect(networkOf(address)).toBe(network);
});
