import { useState } from 'react';

const FEW = 6;

type Offered = { readonly id: string; readonly isOwn: boolean };

/**
 * A club may hold dozens of sites and setups, of which a person uses few: their own and the chosen ones stand first,
 * and the rest waits behind one tap. `showRest` is null where nothing is hidden.
 */
export function useFewFirst<T extends Offered>(
  all: readonly T[],
  chosenIds: readonly string[],
): { shown: readonly T[]; showRest: (() => void) | null } {
  const [isWhole, setWhole] = useState(false);
  // what was chosen at first stays in sight when it is taken back
  const [chosenFirst] = useState(chosenIds);
  const first = all.filter(({ id, isOwn }) => isOwn || chosenIds.includes(id) || chosenFirst.includes(id));
  const few =
    first.length >= FEW ? first : [...first, ...all.filter((one) => !first.includes(one))].slice(0, FEW);
  // two or three more need no key of their own
  if (isWhole || all.length <= few.length + 3) return { shown: all, showRest: null };
  return { shown: all.filter((one) => few.includes(one)), showRest: () => setWhole(true) };
}
