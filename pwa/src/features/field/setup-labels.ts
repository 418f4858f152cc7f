/** What a setup may be called by. */
export type SetupNames = {
  /** With its coupling where it has one: "Long wire, 9:1". */
  readonly antennaName: string;
  readonly receiverName: string;
  readonly ownerName: string;
};

/**
 * Names each setup as shortly as tells it apart in this list: by its antenna, with the receiver where antennas read
 * alike, with the owner where those do too. On the switch of an outing the antenna alone is mostly enough; `atLeast` 2
 * names the receiver always.
 */
export function withLabels<T extends SetupNames>(
  setups: readonly T[],
  atLeast: 1 | 2 = 1,
): (T & { label: string })[] {
  const lengths = [1, 2, 3].filter((length) => length >= atLeast);
  const label = (setup: T, length: number): string =>
    [setup.antennaName, setup.receiverName, setup.ownerName].slice(0, length).filter(Boolean).join(' · ');
  return setups.map((setup) => {
    const isAlone = (length: number): boolean =>
      setups.every((other) => other === setup || label(other, length) !== label(setup, length));
    return { ...setup, label: label(setup, lengths.find(isAlone) ?? 3) };
  });
}
