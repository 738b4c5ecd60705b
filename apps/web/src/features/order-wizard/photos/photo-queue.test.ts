import { describe, expect, it } from 'vitest';
import type { UploadedPhoto } from '#shared/contracts/photos.ts';
import { ApiProblem, NetworkProblem } from '#web/lib/http.ts';
import { PhotoQueue, retryPausesMs } from './photo-queue.ts';

function uploaded(id: string): UploadedPhoto {
  return {
    photo: {
      id,
      kind: 'inspiration',
      note: '',
      width: 4,
      height: 3,
      palette: ['#aabbcc'],
      widths: [4],
      createdAt: '2027-05-03T10:42:00Z',
    },
    claimKey: `claim-${id}`,
  };
}

/** A queue whose uploads and pauses the test ends itself. */
function bench() {
  const calls: {
    readonly name: string;
    readonly signal: AbortSignal;
    readonly onProgress: (share: number) => void;
    readonly end: (photo: UploadedPhoto) => void;
    readonly fail: (error: unknown) => void;
  }[] = [];
  const pauses: { readonly ms: number; readonly run: () => void; off: boolean }[] = [];
  const arrived: string[] = [];
  const queue = new PhotoQueue({
    upload: (_file, name, { signal, onProgress }) =>
      new Promise((end, fail) => {
        signal.addEventListener('abort', () => fail(new Error('aborted')));
        calls.push({ name, signal, onProgress, end, fail });
      }),
    later: (run, ms) => {
      const pause = { ms, run, off: false };
      pauses.push(pause);
      return () => {
        pause.off = true;
      };
    },
  });
  queue.onArrival((photo, from) => arrived.push(`${from.name}=${photo.photo.id}`));
  const states = () => queue.snapshot().map((it) => `${it.name} ${it.state}`);
  return { queue, calls, pauses, arrived, states };
}

const settled = () => new Promise((resolve) => setTimeout(resolve, 0));
const files = (...names: string[]) => names.map((name) => ({ name, file: new Blob([name]) }));

describe('photos on their way', () => {
  it('go one after another and leave the queue as they arrive', async () => {
    const { queue, calls, arrived, states } = bench();
    queue.add(files('one.jpg', 'two.jpg'));
    expect(states()).toEqual(['one.jpg sending', 'two.jpg waiting']);
    calls[0]?.onProgress(0.5);
    expect(queue.snapshot()[0]?.share).toBe(0.5);
    calls[0]?.end(uploaded('p1'));
    await settled();
    expect(states()).toEqual(['two.jpg sending']);
    calls[1]?.end(uploaded('p2'));
    await settled();
    expect(arrived).toEqual(['one.jpg=p1', 'two.jpg=p2']);
    expect(queue.snapshot()).toEqual([]);
  });

  it('wait out a lost connection with growing pauses, then go again', async () => {
    const { queue, calls, pauses, arrived, states } = bench();
    queue.add(files('one.jpg'));
    for (const ms of [...retryPausesMs, retryPausesMs[3]]) {
      calls.at(-1)?.fail(new NetworkProblem('cut'));
      await settled();
      expect(states()).toEqual(['one.jpg lost']);
      expect(pauses.at(-1)?.ms).toBe(ms);
      pauses.at(-1)?.run();
      expect(states()).toEqual(['one.jpg sending']);
    }
    calls.at(-1)?.end(uploaded('p1'));
    await settled();
    expect(arrived).toEqual(['one.jpg=p1']);
  });

  it('try at once when asked, and call the pause off', async () => {
    const { queue, calls, pauses, states } = bench();
    queue.add(files('one.jpg'));
    calls[0]?.fail(new NetworkProblem('cut'));
    await settled();
    queue.retry();
    expect(states()).toEqual(['one.jpg sending']);
    expect(pauses[0]?.off).toBe(true);
  });

  it('leave a refusal to the customer and carry on with the next', async () => {
    const { queue, calls, pauses, states } = bench();
    queue.add(files('notes.jpg', 'two.jpg'));
    calls[0]?.fail(
      new ApiProblem({
        type: 'about:blank',
        title: 'That file is not a picture we can read',
        status: 415,
        code: 'unreadable-photo',
        detail: 'It looks like text.',
      }),
    );
    await settled();
    expect(states()).toEqual(['notes.jpg refused', 'two.jpg sending']);
    expect(queue.snapshot()[0]?.message).toBe('It looks like text.');
    expect(pauses).toEqual([]);
  });

  it('stop what is taken out', async () => {
    const { queue, calls, arrived, states } = bench();
    queue.add(files('one.jpg', 'two.jpg'));
    queue.remove(1);
    await settled();
    expect(calls[0]?.signal.aborted).toBe(true);
    expect(states()).toEqual(['two.jpg sending']);
    queue.clear();
    await settled();
    expect(queue.snapshot()).toEqual([]);
    expect(arrived).toEqual([]);
  });
});
