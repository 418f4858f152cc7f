import { expect, it } from 'vitest';
import { withLabels } from './setup-labels';

const setup = (antennaName: string, receiverName: string, ownerName: string) => ({
  antennaName,
  receiverName,
  ownerName,
});
const labels = (setups: ReturnType<typeof setup>[]) => withLabels(setups).map(({ label }) => label);

it('should call a setup by its antenna alone where that is enough', () => {
  expect(
    labels([setup('Long wire', 'Grey portable', 'Asta'), setup('Whip', 'Grey portable', 'Asta')]),
  ).toEqual(['Long wire', 'Whip']);
});

it('should add the receiver, then the owner, only where setups would read alike', () => {
  const wires = [
    setup('Long wire', 'Grey portable', 'Asta'),
    setup('Long wire', 'Bench set', 'Asta'),
    setup('Long wire', 'Bench set', 'Toke'),
    setup('Whip', 'Bench set', 'Toke'),
  ];
  expect(labels(wires)).toEqual([
    'Long wire · Grey portable',
    'Long wire · Bench set · Asta',
    'Long wire · Bench set · Toke',
    'Whip',
  ]);
});

it('should name the receiver always where that is asked for', () => {
  const [whip] = withLabels([setup('Whip', 'Grey portable', 'Asta')], 2);
  expect(whip!.label).toBe('Whip · Grey portable');
});
