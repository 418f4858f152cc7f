import { useState } from 'react';
import { placeFromFix, type ShareCharacters } from '@harkmoor/sync-model/radio/path/shared-path';
import { Button } from '../../../design/button/Button';
import { ChoiceChips } from '../../../design/choice/ChoiceChips';
import { Sheet } from '../../../design/sheet/Sheet';
import type { OwnFix } from '../data/site-record';
import { placeSizeText, placeText } from './site-words';

type Shared = ShareCharacters | 'exact';

type SharedPlaceFieldProps = {
  readonly fix: OwnFix;
  readonly shared: Shared;
  readonly onShared: (shared: Shared) => void;
};

/** What others see of the place. The exact point takes a second tap, on a preview of what it gives away. */
export function SharedPlaceField({ fix, shared, onShared }: SharedPlaceFieldProps) {
  const [isAskingExact, setAskingExact] = useState(false);
  const options = ([4, 6, 8] as const).map((characters) => {
    const place = placeFromFix(fix, characters);
    return { value: String(characters), label: placeText(place) };
  });
  const choose = (value: string | null): void => {
    if (value === 'exact') setAskingExact(true);
    else if (value !== null) onShared(Number(value) as ShareCharacters);
  };
  return (
    <>
      <ChoiceChips
        label="What others see"
        options={[...options, { value: 'exact', label: 'Exact point' }]}
        value={String(shared)}
        onChange={choose}
      />
      <p className="small">
        Others see {placeSizeText(placeFromFix(fix, shared))}. Maps, exports and reports are made from that,
        never from the exact point{shared === 'exact' ? ', which you have chosen to share' : ''}.
      </p>
      <Sheet isOpen={isAskingExact} title="Share the exact point?" onClose={() => setAskingExact(false)}>
        <p className="num">
          Every member of the club, and whoever gets an export, would see{' '}
          <strong>{placeText(placeFromFix(fix, 'exact'))}</strong>. What others have received cannot be taken
          back.
        </p>
        <Button
          wide
          look="danger"
          onClick={() => {
            onShared('exact');
            setAskingExact(false);
          }}
        >
          Share the exact point
        </Button>
        <Button wide look="outline" onClick={() => setAskingExact(false)}>
          Keep the square
        </Button>
      </Sheet>
    </>
  );
}
