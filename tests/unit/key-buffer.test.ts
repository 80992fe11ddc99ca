import { afterEach, beforeEach, expect, test, vi } from 'vitest';
import { KeyBuffer } from '@/components/ui/key-buffer';

beforeEach(() => vi.useFakeTimers());
afterEach(() => vi.useRealTimers());

function setup() {
  const keys: string[] = [];
  const scans: string[] = [];
  const buffer = new KeyBuffer({ onKey: (key) => keys.push(key), onScan: (text) => scans.push(text) });
  const burst = (text: string, pauseMs: number) => {
    for (const key of text) {
      buffer.push(key);
      vi.advanceTimersByTime(pauseMs);
    }
  };
  return { keys, scans, buffer, burst };
}

test('keys pressed one by one are single keys', () => {
  const { keys, scans, burst } = setup();
  burst('gb', 200);
  expect({ keys, scans }).toEqual({ keys: ['g', 'b'], scans: [] });
});

test('two quick keys stay two keys, in order', () => {
  const { keys, buffer, burst } = setup();
  burst('jk', 1);
  expect(buffer.end()).toBe(false);
  expect(keys).toEqual(['j', 'k']);
});

test('a scanner that ends with Enter is one number, and presses nothing', () => {
  const { keys, scans, buffer, burst } = setup();
  burst('B-0404', 3);
  expect(buffer.end()).toBe(true);
  expect({ keys, scans }).toEqual({ keys: [], scans: ['B-0404'] });
});

test('a scanner without Enter is understood after a pause', () => {
  const { scans, burst } = setup();
  burst('B-0404', 3);
  vi.advanceTimersByTime(100);
  expect(scans).toEqual(['B-0404']);
});

test('what was typed before the page was left is forgotten', () => {
  const { keys, scans, buffer, burst } = setup();
  burst('B-04', 3);
  buffer.stop();
  vi.advanceTimersByTime(100);
  expect([...keys, ...scans]).toEqual([]);
});
