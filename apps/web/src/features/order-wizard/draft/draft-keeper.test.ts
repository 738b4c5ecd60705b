import { describe, expect, it } from 'vitest';
import { DraftKeeper } from './draft-keeper.ts';
import type { DraftRecord } from './draft-record.ts';
import type { DraftShelf } from './draft-storage.ts';
import { emptyOrder } from './empty-order.ts';

/** One device with a shelf that several pages share, and a clock the test sets. */
function device() {
  let stored: DraftRecord | null = null;
  let full = false;
  let now = 1000;
  const pages: { readonly writer: string; readonly tell: (record: DraftRecord | null) => void }[] =
    [];
  const open = (writer: string) => {
    const timers: (() => void)[] = [];
    const shelf: DraftShelf = {
      read: () => stored,
      write: (record) => {
        if (full) return false;
        stored = record;
        for (const page of pages) if (page.writer !== writer) page.tell(record);
        return true;
      },
      clear: () => {
        stored = null;
        for (const page of pages) if (page.writer !== writer) page.tell(null);
      },
      onOtherPage: (listen) => {
        pages.push({ writer, tell: listen });
        return () => undefined;
      },
    };
    const keeper = new DraftKeeper(
      {
        shelf,
        writer,
        now: () => now,
        later: (run) => {
          timers.push(run);
          return () => timers.splice(timers.indexOf(run), 1);
        },
      },
      stored,
    );
    const rest = () => timers.splice(0).forEach((run) => run());
    return { keeper, rest };
  };
  return {
    open,
    stored: () => stored,
    fill: () => {
      full = true;
    },
    pass: (ms: number) => {
      now += ms;
    },
  };
}

function content(note: string) {
  const values = emptyOrder();
  values.look.note = note;
  return { values, reached: 'day' as const, pictures: {}, attempt: null };
}

describe('keeping a draft', () => {
  it('waits until typing rests and then says when it was kept', () => {
    const { open, stored } = device();
    const { keeper, rest } = open('a');
    keeper.keep(content('o'));
    keeper.keep(content('one'));
    expect(stored()).toBeNull();
    rest();
    expect(stored()?.values.look.note).toBe('one');
    expect(keeper.status().savedAt).toBe(1000);
  });

  it('keeps at once what still waits when the page goes away', () => {
    const { open, stored } = device();
    const { keeper } = open('a');
    keeper.keep(content('one'));
    keeper.flush();
    expect(stored()?.values.look.note).toBe('one');
  });

  it('says so when the device will not keep it', () => {
    const { open, fill } = device();
    const { keeper, rest } = open('a');
    fill();
    keeper.keep(content('one'));
    rest();
    expect(keeper.status()).toMatchObject({ refused: true, savedAt: null });
  });

  it('never writes over a newer draft of another page: it offers it', () => {
    const { open, stored, pass } = device();
    const a = open('a');
    a.keeper.keep(content('by a'));
    a.rest();
    const b = open('b');
    a.keeper.listen();
    pass(5000);
    b.keeper.keep(content('by b'));
    b.rest();
    expect(a.keeper.status().other).toMatchObject({ values: { look: { note: 'by b' } } });
    a.keeper.keep(content('by a, later'));
    a.rest();
    a.keeper.flush();
    expect(stored()?.values.look.note).toBe('by b');

    a.keeper.keepMine();
    expect(stored()?.values.look.note).toBe('by a, later');
    expect(a.keeper.status().other).toBeNull();
  });

  it('finds the newer draft even if it was never told', () => {
    const { open, stored, pass } = device();
    const a = open('a');
    const b = open('b');
    pass(5000);
    b.keeper.keep(content('by b'));
    b.rest();
    a.keeper.keep(content('by a'));
    a.rest();
    expect(stored()?.values.look.note).toBe('by b');
    expect(a.keeper.takeOther()?.values.look.note).toBe('by b');
    pass(10);
    a.keeper.keep(content('by a on top'));
    a.rest();
    expect(stored()?.values.look.note).toBe('by a on top');
  });

  it('says so when the order was sent from another page, and waits to be told', () => {
    const { open, stored } = device();
    const a = open('a');
    a.keeper.keep(content('one'));
    a.rest();
    const b = open('b');
    a.keeper.listen();
    b.keeper.clear();
    expect(a.keeper.status().other).toBe('cleared');
    a.keeper.keep(content('two'));
    a.rest();
    expect(stored()).toBeNull();
    expect(a.keeper.takeOther()).toBeNull();
    expect(a.keeper.status()).toMatchObject({ other: null, savedAt: null });
  });

  it('leaves nothing behind once the order is sent', () => {
    const { open, stored } = device();
    const { keeper, rest } = open('a');
    keeper.keep(content('one'));
    rest();
    keeper.keep(content('two'));
    keeper.clear();
    rest();
    expect(stored()).toBeNull();
    expect(keeper.status().savedAt).toBeNull();
  });
});
