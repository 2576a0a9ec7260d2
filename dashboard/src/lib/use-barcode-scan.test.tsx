import { render, screen } from '@testing-library/react';
import { beforeEach, describe, expect, it, vi } from 'vitest';
import { useBarcodeScan } from './use-barcode-scan';

const onScan = vi.fn<(code: string) => void>();

function Page() {
  useBarcodeScan(onScan);
  return (
    <>
      <button type="button">Act</button>
      <input aria-label="Note" />
    </>
  );
}

let clock = 0;

/** Presses a key `gap` milliseconds after the last one; returns whether it kept its own effect. */
function press(target: EventTarget, key: string, gap: number): boolean {
  const event = new KeyboardEvent('keydown', { key, bubbles: true, cancelable: true });
  clock += gap;
  Object.defineProperty(event, 'timeStamp', { value: clock });
  return target.dispatchEvent(event);
}

const type = (target: EventTarget, code: string, gap: number): boolean =>
  [...code, 'Enter'].map((key) => press(target, key, gap)).every(Boolean);

describe('useBarcodeScan', () => {
  beforeEach(() => {
    onScan.mockClear();
    clock += 10_000;
    render(<Page />);
  });

  it('hears fast keys that end in Enter', () => {
    type(document.body, 'W26480417', 8);
    expect(onScan).toHaveBeenCalledExactlyOnceWith('W26480417');
  });

  it('does not let the Enter press the button that has the focus', () => {
    expect(type(screen.getByRole('button'), 'W26480417', 8)).toBe(false);
  });

  it('leaves a person who types alone', () => {
    expect(type(document.body, 'W26480417', 160)).toBe(true);
    expect(onScan).not.toHaveBeenCalled();
  });

  it('forgives one late key on a busy machine', () => {
    press(document.body, 'W', 500);
    press(document.body, '2', 150);
    type(document.body, '6480417', 8);
    expect(onScan).toHaveBeenCalledExactlyOnceWith('W26480417');
  });

  it('leaves fields their text', () => {
    type(screen.getByRole('textbox'), 'W26480417', 8);
    expect(onScan).not.toHaveBeenCalled();
  });

  it('takes only the fast run behind slow keys', () => {
    press(document.body, 'x', 500);
    press(document.body, 'W', 500);
    type(document.body, '26480417', 8);
    expect(onScan).toHaveBeenCalledExactlyOnceWith('W26480417');
  });
});
