import { useMemo, useState } from 'react';
import { bandAt, bandLabel, metreBands, type Band } from '@harkmoor/sync-model/radio/bands/bands';
import {
  formatFrequency,
  frequencyText,
  readFrequency,
} from '@harkmoor/sync-model/radio/bands/frequency-text';
import type { ItuRegion } from '@harkmoor/sync-model/radio/bands/region';
import { usualMode } from '@harkmoor/sync-model/radio/bands/usual-mode';
import type { Mode } from '@harkmoor/sync-model/records/common-fields';

export type FrequencyOffer = { label: string; text: string };

/** What the typed text means, and what else it might. */
export type FrequencyEntry = {
  text: string;
  setText: (text: string) => void;
  frequencyHz: number | null;
  /** "6 070 kHz · 49 m broadcast", or what is wrong. */
  words: string;
  isWrong: boolean;
  offers: FrequencyOffer[];
  mode: Mode;
  setMode: (mode: Mode) => void;
};

/** Reads the entry as it is typed. The mode follows the band until it is chosen by hand. */
export function useFrequencyEntry(region: ItuRegion): FrequencyEntry {
  const [text, setText] = useState('');
  const [chosenMode, setMode] = useState<Mode | null>(null);
  const read = useMemo(() => meaningOf(text, region), [text, region]);
  const mode = chosenMode ?? (read.frequencyHz === null ? 'AM' : usualMode(read.frequencyHz, region));
  return { text, setText, ...read, mode, setMode };
}

type Meaning = Pick<FrequencyEntry, 'frequencyHz' | 'words' | 'isWrong' | 'offers'>;

function meaningOf(text: string, region: ItuRegion): Meaning {
  const reading = readFrequency(text);
  if (reading.kind === 'metre-band') {
    const bands = metreBands(reading.metres, region);
    const words =
      bands.length > 0
        ? 'Start from the band’s lower edge:'
        : `There is no ${reading.metres}\u202fm band here.`;
    return { frequencyHz: null, words, isWrong: bands.length === 0, offers: bands.map(bandOffer) };
  }
  const offers = reading.alternativeHz === null ? [] : [mhzOffer(reading.alternativeHz)];
  if (reading.kind === 'refused') {
    const isWrong = reading.code !== 'empty';
    return { frequencyHz: null, words: reading.message, isWrong, offers };
  }
  const band = bandAt(reading.frequencyHz, region);
  const words = [frequencyText(reading.frequencyHz), band ? bandLabel(band) : 'outside the bands'].join(
    ' · ',
  );
  return { frequencyHz: reading.frequencyHz, words, isWrong: false, offers };
}

function mhzOffer(frequencyHz: number): FrequencyOffer {
  return { label: `${frequencyHz / 1e6}\u202fMHz`, text: `${frequencyHz / 1e6}M` };
}

function bandOffer(band: Band): FrequencyOffer {
  const { figure, unit } = formatFrequency(band.lowHz);
  const plain = figure.replace(/\s/g, '');
  const high = formatFrequency(band.highHz).figure;
  return {
    label: `${bandLabel(band)} ${figure}–${high}\u202f${unit}`,
    text: unit === 'MHz' ? `${plain}M` : plain,
  };
}
