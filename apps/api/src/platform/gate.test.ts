import { describe, expect, it } from 'vitest';
import { createGate, GateFull } from './gate.ts';

describe('a gate', () => {
  it('lets so many in at once, in turn, and refuses when too many wait', async () => {
    const gate = createGate({ atOnce: 2, waiting: 1 });
    const log: string[] = [];
    const opens: (() => void)[] = [];
    const work = (name: string) => () =>
      new Promise<void>((resolve) => {
        log.push(name);
        opens.push(resolve);
      });
    const running = [gate.run(work('a')), gate.run(work('b')), gate.run(work('c'))];
    await expect(gate.run(work('d'))).rejects.toBeInstanceOf(GateFull);
    expect(log).toEqual(['a', 'b']);
    opens[0]?.();
    await running[0];
    expect(log).toEqual(['a', 'b', 'c']);
    opens[1]?.();
    opens[2]?.();
    await Promise.all(running);
  });

  it('opens again after work that failed', async () => {
    const gate = createGate({ atOnce: 1, waiting: 0 });
    await expect(gate.run(() => Promise.reject(new Error('no')))).rejects.toThrow('no');
    await expect(gate.run(() => Promise.resolve('yes'))).resolves.toBe('yes');
  });
});
