import { screen, within } from '@testing-library/react';
import { HttpResponse, http } from 'msw';
import { Route, Routes } from 'react-router-dom';
import { beforeEach, describe, expect, it } from 'vitest';
import type { CalendarDay, CalendarView, PlannedTask } from '#shared/contracts/staff.ts';
import { addDays } from '#shared/dates/local-time.ts';
import { menuFixture } from '#shared/kitchen/testing/menu-fixture.ts';
import { startApiServer } from '#web/testing/api-server.ts';
import { renderAt } from '#web/testing/render-at.tsx';
import {
  confirmationFixture,
  eggStop,
  nothingAllowed,
  staffOrderFixture,
} from '#web/testing/staff-order.ts';
import { CalendarPage } from './calendar-page.tsx';

const server = startApiServer();
const monday = '2027-06-14';

const day = (n: number, changes: Partial<CalendarDay> = {}): CalendarDay => ({
  date: addDays(monday, n),
  closed: n === 6 ? { id: null, reason: 'Closed on Sundays' } : null,
  benchMinutes: n === 6 ? 0 : 720,
  plannedMinutes: 0,
  pickups: 0,
  shifts: n === 6 ? [] : [{ start: 480, end: 720, people: ['Ida Thorne'] }],
  why: [],
  ...changes,
});

const task = (kind: PlannedTask['kind'], n: number, start: number): PlannedTask => ({
  id: `${kind}${n}`,
  kind,
  label: kind === 'bake' ? 'Bake lemon sponge' : 'Final coat',
  startAt: `${addDays(monday, n)}T12:00:00.000Z`,
  date: addDays(monday, n),
  start,
  minutes: 40,
  state: 'planned',
  pinned: false,
});

const view: CalendarView = {
  today: '2027-06-15',
  days: [
    day(0),
    day(1),
    day(2),
    day(3),
    day(4, { plannedMinutes: 720, pickups: 1, why: ['No. 2421 decorating 1 h 40'] }),
    day(5, { plannedMinutes: 800 }),
    day(6),
  ],
  lanes: [
    {
      number: 2421,
      customer: 'T. Marchetti',
      summary: 'Three tiers, 71 portions',
      status: 'confirmed',
      pickup: {
        date: '2027-06-18',
        start: 600,
        minutes: 30,
        zone: 'America/New_York',
        startAt: '2027-06-18T14:00:00.000Z',
      },
      tasks: [task('bake', 2, 540), task('final-coat', 3, 600)],
      allergies: true,
      can: { start: true, ready: false, collect: false },
      rowVersion: 1,
    },
  ],
  waiting: [
    {
      number: 2431,
      rowVersion: 3,
      customer: 'Rosa Marchetti',
      summary: 'Three tiers, 10, 8 and 6 in',
      pickup: staffOrderFixture().pickup,
      advice: null,
      fits: { fits: true, sentence: 'Fits: 6 h 20 on Thursday and Friday.' },
      totalMinor: 46_600,
      currency: 'USD',
      can: { confirm: true, decline: true },
    },
    {
      number: 2432,
      rowVersion: 1,
      customer: 'Ken Ito',
      summary: 'One tier, 8 in',
      pickup: staffOrderFixture().pickup,
      advice: eggStop,
      fits: { fits: false, sentence: 'Asked without a promise.' },
      totalMinor: 6_800,
      currency: 'USD',
      can: { confirm: true, decline: true },
    },
  ],
  can: { blockDays: true },
};

let shown = view;

beforeEach(() => {
  shown = view;
  server.use(
    http.get('*/api/menu', () => HttpResponse.json(menuFixture)),
    http.get('*/api/session', () => HttpResponse.json({ user: null, googleSignIn: false })),
    http.get('*/api/staff/calendar', () => HttpResponse.json(shown)),
  );
});

function open(search = '?view=week&date=2027-06-15') {
  return renderAt(
    `/staff/calendar${search}`,
    <Routes>
      <Route path="/staff/calendar" element={<CalendarPage />} />
    </Routes>,
  );
}

describe('the week', () => {
  it('says each day’s load in words, full as good news and overfull as what it is', async () => {
    open();
    const days = within(await screen.findByRole('group', { name: 'Days' }));
    expect(
      days.getByRole('button', {
        name: 'Friday 18 June: 12 of 12 h at the bench, full, and it fits, 1 pickup',
      }),
    ).toBeVisible();
    expect(
      days.getByRole('button', {
        name: 'Saturday 19 June: 13.3 of 12 h at the bench, 1 h 20 too much',
      }),
    ).toBeVisible();
    expect(days.getByRole('button', { name: 'Sunday 20 June: closed' })).toBeVisible();
  });

  it('goes from day to day by arrow keys and explains the one in focus', async () => {
    const { user } = open();
    const today = await screen.findByRole('button', { name: /Tuesday 15 June, today/ });
    expect(today).toHaveAttribute('tabindex', '0');
    await user.click(today);
    await user.keyboard('{ArrowRight}{ArrowRight}{ArrowRight}');
    expect(screen.getByRole('button', { name: /Friday 18 June/ })).toHaveFocus();
    expect(screen.getByText(/No\. 2421 decorating 1 h 40/)).toBeVisible();
    await user.keyboard('{Home}');
    expect(screen.getByRole('button', { name: /Monday 14 June/ })).toHaveFocus();
  });

  it('strings a cake’s work: one stop, arrow keys from bead to bead, each in words', async () => {
    const { user } = open();
    const work = within(await screen.findByRole('group', { name: 'Work on No. 2421' }));
    const beads = work.getAllByRole('button');
    expect(beads.map((it) => it.getAttribute('tabindex'))).toEqual(['0', '-1']);
    beads[0]?.focus();
    await user.keyboard('{ArrowRight}');
    expect(
      work.getByRole('button', { name: 'Final coat, Thursday 17 June 10:00, 40 min.' }),
    ).toHaveFocus();
  });

  it('blocks a day with a reason and says which orders stand on it', async () => {
    const sent: unknown[] = [];
    server.use(
      http.post('*/api/staff/closures', async ({ request }) => {
        sent.push(await request.json());
        return HttpResponse.json({ id: 'c1', standing: [2421] });
      }),
    );
    const { user } = open();
    await user.click(await screen.findByRole('button', { name: /Friday 18 June/ }));
    await user.click(screen.getByRole('button', { name: 'Block this day' }));
    await user.type(
      screen.getByRole('textbox', { name: 'Why Friday 18 June is blocked' }),
      'The oven is serviced',
    );
    await user.click(screen.getByRole('button', { name: 'Block it' }));
    expect(await screen.findByText(/These stay on it: No\. 2421\./)).toBeVisible();
    expect(sent).toEqual([{ date: '2027-06-18', reason: 'The oven is serviced' }]);
  });

  it('opens a blocked day again', async () => {
    const opened: string[] = [];
    shown = {
      ...view,
      days: view.days.map((it) =>
        it.date === '2027-06-17'
          ? { ...it, closed: { id: 'c9', reason: 'The oven is serviced' } }
          : it,
      ),
    };
    server.use(
      http.delete('*/api/staff/closures/:id', ({ params }) => {
        opened.push(String(params.id));
        return HttpResponse.json({ done: true });
      }),
    );
    const { user } = open();
    await user.click(await screen.findByRole('button', { name: /^Thursday 17 June/ }));
    await user.click(screen.getByRole('button', { name: 'Open it again' }));
    expect(await screen.findByText('Thursday 17 June is open again.')).toBeVisible();
    expect(opened).toEqual(['c9']);
  });
});

describe('what waits', () => {
  it('opens the last look from the calendar; what is stopped goes to its page instead', async () => {
    server.use(
      http.get('*/api/staff/orders/2431', () =>
        HttpResponse.json(staffOrderFixture({ can: { ...nothingAllowed, confirm: true } })),
      ),
      http.get('*/api/staff/orders/2431/confirmation', () =>
        HttpResponse.json(confirmationFixture()),
      ),
    );
    const { user } = open();
    await user.click(await screen.findByRole('button', { name: /^Confirm ?No\. 2431/ }));
    expect(await screen.findByRole('dialog', { name: 'Confirm No. 2431' })).toBeVisible();
    expect(screen.queryByRole('button', { name: /^Confirm ?No\. 2432/ })).toBeNull();
    expect(screen.getByText(eggStop.plain)).toBeInTheDocument();
    expect(screen.getByText('Open and settle')).toHaveAttribute(
      'href',
      '/staff/orders/2432#settle',
    );
  });
});

describe('the other views', () => {
  it('counts pickups and who waits in the month', async () => {
    open('?view=month&date=2027-06-15');
    expect(await screen.findByRole('heading', { level: 1, name: 'June 2027' })).toBeVisible();
    expect(
      await screen.findByRole('button', { name: /^Friday 18 June: .*1 pickup/ }),
    ).toBeVisible();
  });

  it('lists a day’s work by shift, and its pickups', async () => {
    open('?view=day&date=2027-06-16');
    const shift = within(await screen.findByRole('region', { name: 'Shift 08:00 to 12:00' }));
    expect(shift.getByRole('listitem')).toHaveTextContent(
      '09:00Bake lemon sponge 2421 T. Marchetti40 min',
    );
    expect(screen.getByText('Nobody collects this day.')).toBeVisible();
  });
});
