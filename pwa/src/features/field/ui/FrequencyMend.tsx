import { useState } from 'react';
import { formatFrequency, readFrequency } from '@harkmoor/sync-model/radio/bands/frequency-text';
import { TextField } from '../../../design/form/TextField';

type FrequencyMendProps = { readonly dialHz: number; readonly onFrequency: (dialHz: number) => void };

/** The dial of a stored entry, put right. What cannot be read changes nothing and says why. */
export function FrequencyMend({ dialHz, onFrequency }: FrequencyMendProps) {
  const [text, setText] = useState(() => {
    const { figure, unit } = formatFrequency(dialHz);
    return unit === 'MHz' ? `${figure} MHz` : figure;
  });
  const reading = readFrequency(text);
  const error =
    reading.kind === 'refused'
      ? reading.message
      : reading.kind === 'metre-band'
        ? 'Type the frequency itself, in kHz.'
        : null;
  const type = (next: string): void => {
    setText(next);
    const read = readFrequency(next);
    if (read.kind === 'frequency') onFrequency(read.frequencyHz);
  };
  return (
    <TextField
      label="Dial, kHz"
      figures
      inputMode="decimal"
      required
      value={text}
      onChange={type}
      error={error}
    />
  );
}
