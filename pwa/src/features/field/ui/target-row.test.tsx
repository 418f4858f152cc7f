// @vitest-environment jsdom
import { act, cleanup, fireEvent, render, screen } from '@testing-library/react';
import { afterEach, beforeEach, describe, expect, it, vi } from 'vitest';
import type { StoredTarget } from '../data/outing-frame';
import { TargetRow, type RowActs } from './TargetRow';

const NOW = Date.UTC(2026, 10, 12, 18, 42, 7);
const target = {
  id: 't',
  fields: { name: 'Radio Lindholt', frequencyHz: 6_070_000, mode: 'AM' },
} as StoredTarget;

type Told = { what: string; atMs?: number };
let told: Told[];
const acts: RowActs = {
  onHeard: (_, atMs) => told.push({ what: 'heard', atMs }),
  onNil: (_, atMs) => told.push({ what: 'nil', atMs }),
  onNilReason: (_, atMs) => told.push({ what: 'reason', atMs }),
  onTryAnyway: () => told.push({ what: 'anyway' }),
  onMore: () => told.push({ what: 'more' }),
  onEdit: () => told.push({ what: 'edit' }),
};

function show(over: Partial<Parameters<typeof TargetRow>[0]> = {}) {
  render(
    <ul>
      <TargetRow
        row={{ target, entry: null, isOnAir: true, isNext: true }}
        onAir={{ kind: 'on', until: Date.UTC(2026, 10, 12, 20) }}
        isTriedAnyway={false}
        path="862 km · 98°"
        setupLabel=""
        nowMs={NOW}
        acts={acts}
        {...over}
      />
    </ul>,
  );
}

function passMs(ms: number): void {
  act(() => {
    vi.advanceTimersByTime(ms);
  });
}

beforeEach(() => {
  told = [];
  vi.useFakeTimers({ now: NOW });
});
afterEach(() => {
  cleanup();
  vi.useRealTimers();
});

describe('a row of the round', () => {
  it('should name its answers in full for a screen reader', () => {
    show();
    expect(screen.getByRole('button', { name: 'Heard, 6070 kilohertz, Radio Lindholt' })).toBeTruthy();
    expect(screen.getByRole('button', { name: 'Nil, 6070 kilohertz, Radio Lindholt' })).toBeTruthy();
    expect(screen.getByText('862 km · 98° · on air to 20:00')).toBeTruthy();
  });

  it('should take the moment at which the finger came down on Nil as the time of the entry', () => {
    show();
    const nil = screen.getByRole('button', { name: /^Nil/ });
    fireEvent.pointerDown(nil, { button: 0 });
    passMs(200);
    fireEvent.pointerUp(nil);
    fireEvent.click(nil);
    expect(told).toEqual([{ what: 'nil', atMs: NOW }]);
  });

  it('should ask the reason at a long press, once, and log no plain nil', () => {
    show();
    const nil = screen.getByRole('button', { name: /^Nil/ });
    fireEvent.pointerDown(nil, { button: 0 });
    passMs(600);
    fireEvent.pointerUp(nil);
    fireEvent.click(nil);
    expect(told).toEqual([{ what: 'reason', atMs: NOW }]);
  });

  it('should answer a key press as it answers a tap', () => {
    show();
    fireEvent.click(screen.getByRole('button', { name: /^Nil/ }));
    expect(told).toEqual([{ what: 'nil', atMs: NOW }]);
  });

  it('should offer only a small Try anyway off its schedule', () => {
    show({ onAir: { kind: 'off', from: Date.UTC(2026, 10, 12, 19) } });
    expect(screen.getByText('Off air until 19:00')).toBeTruthy();
    expect(screen.queryByRole('button', { name: /^Heard/ })).toBeNull();
    fireEvent.click(screen.getByRole('button', { name: /^Try anyway/ }));
    expect(told).toEqual([{ what: 'anyway' }]);
  });
});
