import { addDays, instantAt, today } from '#shared/dates/local-time.ts';
import { databaseFile, openDatabase } from '#api/db/database.ts';
import { migrateDatabase } from '#api/db/migrate.ts';
import type { Order } from '#api/db/models/order.ts';
import { OutboxRow } from '#api/db/models/outbox-row.ts';
import { Person } from '#api/db/models/person.ts';
import { User } from '#api/db/models/user.ts';
import { hasRun, runOnce } from '#api/db/seeders/run-once.ts';
import { seedAll } from '#api/db/seeders/seed-all.ts';
import { inTransaction } from '#api/db/transaction.ts';
import type { Deps } from '#api/modules/deps.ts';
import { writeMessage } from '#api/modules/messages/write-message.command.ts';
import { withdrawOrder } from '#api/modules/orders/withdraw-order.command.ts';
import { loadCurrentRevision } from '#api/modules/orders/orders.queries.ts';
import { collectOrder } from '#api/modules/staff-orders/collect-order.command.ts';
import { confirmOrder } from '#api/modules/staff-orders/confirm-order.command.ts';
import { declineOrder } from '#api/modules/staff-orders/decline-order.command.ts';
import { markOrder } from '#api/modules/staff-orders/mark-order.command.ts';
import type { Staff } from '#api/platform/actor.ts';
import { hashPassword } from '#api/platform/passwords.ts';
import { DemoClock } from './demo-clock.ts';
import { addStaffPicture, sendDemoOrder } from './demo-desk.ts';
import type { Wanted } from './demo-desk.ts';
import { everydayForms } from './demo-everyday-forms.ts';
import { demoForms } from './demo-forms.ts';
import type { DemoForm } from './demo-parts.ts';
import { demoStaff } from './demo-people.ts';
import { drawings } from './demo-pictures.ts';
import { demoBook } from './demo-schedule.ts';
import type { Promised } from './demo-schedule.ts';
import { Timeline } from './timeline.ts';

/** How long ago the demo's studio opened its book, days. */
const openedDaysAgo = 20;

/**
 * Fills a data folder for the demo, once: the studio, its people with printed passwords, and a
 * fortnight's book with orders in every state, made by the real commands at the times they would have been made,
 * so that plan, prices and events are true. Their e-mails are not sent: whoever tries the demo
 * finds in the mailbox only what came of what they did.
 * @throws when the folder's database is open in this process
 */
export async function fillDemo(
  { env, logger }: Pick<Deps, 'env' | 'logger'>,
  now: Date,
): Promise<void> {
  await migrateDatabase(databaseFile(env.dataDir));
  const clock = new DemoClock(now);
  const database = await openDatabase(env.dataDir, { clock, logger });
  try {
    if (await hasRun('demo')) return;
    clock.set(new Date(now.getTime() - openedDaysAgo * 86_400_000));
    await seedAll(database, { clock, demo: true });
    const staff = await hireStaff();
    await new DemoBook({ database, clock, env, logger }, clock, staff, now).write();
    clock.set(now);
    await runOnce('demo', async () => {
      await OutboxRow.update({ state: 'done', doneAt: now }, { where: { state: 'queued' } });
    });
  } finally {
    await database.close();
  }
}

type Hired = { readonly ida: Staff; readonly noor: Staff; readonly pia: Staff };

async function hireStaff(): Promise<Hired> {
  const hired: Staff[] = [];
  for (const { name, email, role, password, personId } of demoStaff) {
    const passwordHash = await hashPassword(password);
    hired.push(
      await inTransaction(async () => {
        const user =
          (await User.findOne({ where: { email } })) ??
          (await User.create({ name, email, role, passwordHash, emailProvenAt: new Date() }));
        if (personId !== null)
          await Person.update({ userId: user.id }, { where: { id: personId } });
        return { kind: 'staff', role, userId: user.id, name, email };
      }),
    );
  }
  const named = (name: string): Staff => {
    const found = hired.find((it) => it.name.startsWith(name));
    if (found === undefined) throw new Error(`Nobody is called ${name}.`);
    return found;
  };
  return { ida: named('Ida'), noor: named('Noor'), pia: named('Pia') };
}

/** The demo's three weeks before now and what is promised after. */
class DemoBook {
  readonly #deps: Deps;
  readonly #staff: Hired;
  readonly #timeline: Timeline;
  readonly #now: Date;
  readonly #day: string;
  readonly #zone = 'America/New_York';

  constructor(deps: Deps, clock: DemoClock, staff: Hired, now: Date) {
    this.#deps = deps;
    this.#staff = staff;
    this.#now = now;
    this.#timeline = new Timeline(clock, now);
    this.#day = today(now, this.#zone);
  }

  async write(): Promise<void> {
    for (const promised of demoBook) this.#promised(promised);
    this.#declined();
    this.#withdrawn();
    this.#waiting();
    await this.#timeline.run();
  }

  /** An order that was confirmed the day after, and has got as far as its pickup lets it. */
  #promised(promised: Promised): void {
    const { form, sent } = promised;
    this.#timeline.add(this.#at(sent, 19 * 60 + 12), async () => {
      const order = await this.#send(form, { ...promised, opensLink: true });
      if (order === null) return;
      this.#timeline.add(this.#at(sent + 1, 8 * 60 + 25), () => this.#confirm(order));
      if (form === demoForms.wedding) this.#talk(order, sent + 2);
      this.#make(order, promised);
    });
  }

  /** Begun the day before, ready an hour ahead, collected at its window; sooner where it says so. */
  #make(order: Order, { form, already, picture }: Promised): void {
    const { noor, pia } = this.#staff;
    const pickupAt = order.pickupAt ?? this.#now;
    const byNow = (at: Date, hours: number): Date =>
      already === undefined ? at : earlier(at, hoursAfter(this.#now, -hours));
    this.#timeline.add(byNow(hoursAfter(pickupAt, -26), 5), () => this.#mark(order, 'start', noor));
    if (already === 'making') return;
    this.#timeline.add(byNow(hoursAfter(pickupAt, -1), 1), async () => {
      await this.#mark(order, 'ready', noor);
      if (picture !== undefined) {
        await addStaffPicture(this.#deps, order, 'finished', noor, drawings[picture]);
      }
    });
    if (already === 'ready') return;
    this.#timeline.add(hoursAfter(pickupAt, 0.2), async () => {
      const photoId =
        picture === undefined
          ? null
          : await addStaffPicture(this.#deps, order, 'handover', pia, drawings[picture]);
      await order.reload();
      await collectOrder(this.#deps, {
        order,
        actor: pia,
        rowVersion: order.rowVersion,
        collectedBy: form.you.otherCollects ? form.you.collectorName : form.you.name,
        condition: 'Perfect, boxed, with candle and care card.',
        photoId,
      });
    });
  }

  #talk(order: Order, day: number): void {
    const guest = { kind: 'guest', orderIds: [order.id] } as const;
    this.#timeline.add(this.#at(day, 20 * 60 + 4), () =>
      writeMessage({
        order,
        actor: guest,
        body: 'One of our aunts cannot have seeds. Is the raspberry strained?',
      }),
    );
    this.#timeline.add(this.#at(day + 1, 8 * 60 + 40), () =>
      writeMessage({
        order,
        actor: this.#staff.ida,
        body: 'It is not as we make it, but we can strain yours. I have put it on the order.',
      }),
    );
  }

  #declined(): void {
    this.#timeline.add(this.#at(-6, 14 * 60), async () => {
      const order = await this.#send(demoForms.gardenParty, {
        from: 4,
        to: 20,
        prefer: 'first',
        window: 1,
        opensLink: true,
      });
      if (order === null) return;
      this.#timeline.add(this.#at(-5, 9 * 60), async () => {
        await order.reload();
        await declineOrder(this.#deps, {
          order,
          revision: await loadCurrentRevision(order),
          actor: this.#staff.ida,
          rowVersion: order.rowVersion,
          reason:
            'French buttercream would not stand two and a half hours of sun at 84 °F, and we would rather say so now. In fondant, or indoors until you cut it, we would love to make it.',
          offerDates: true,
        });
      });
    });
  }

  #withdrawn(): void {
    this.#timeline.add(this.#at(-5, 11 * 60), async () => {
      const order = await this.#send(demoForms.secondThoughts, {
        from: 8,
        to: 24,
        prefer: 'first',
        window: 2,
        opensLink: true,
      });
      if (order === null) return;
      this.#timeline.add(this.#at(-4, 17 * 60), async () => {
        await order.reload();
        await withdrawOrder(this.#deps, {
          order,
          actor: { kind: 'guest', orderIds: [order.id] },
          rowVersion: order.rowVersion,
          reason: 'The party moved to my sister, who bakes.',
        });
      });
    });
  }

  /** Four requests nobody has answered: an allergy in the way, two simple ones, one without a promise. */
  #waiting(): void {
    this.#timeline.add(hoursAfter(this.#now, -7), async () => {
      await this.#send(demoForms.eggAllergy, {
        from: 8,
        to: 24,
        prefer: 'first',
        window: 0,
        opensLink: true,
        pictures: ['sky'],
      });
    });
    this.#timeline.add(hoursAfter(this.#now, -4), async () => {
      await this.#send(demoForms.smallAmerican, {
        from: 7,
        to: 24,
        prefer: 'first',
        window: 3,
        opensLink: true,
      });
    });
    this.#timeline.add(hoursAfter(this.#now, -3), async () => {
      await this.#send(everydayForms.vance, {
        from: 9,
        to: 24,
        prefer: 'first',
        window: 2,
        opensLink: true,
      });
    });
    this.#timeline.add(hoursAfter(this.#now, -2), async () => {
      await this.#send(demoForms.boat, {
        from: 12,
        to: 60,
        prefer: 'first',
        window: 0,
        opensLink: true,
        askUs: true,
      });
    });
  }

  #send(
    form: DemoForm,
    plan: Omit<Wanted, 'form' | 'from' | 'to' | 'pictures'> & {
      readonly from: number;
      readonly to: number;
      readonly pictures?: readonly (keyof typeof drawings)[];
    },
  ): Promise<Order | null> {
    const { from, to } = plan;
    return sendDemoOrder(this.#deps, {
      form,
      prefer: plan.prefer,
      window: plan.window,
      opensLink: plan.opensLink,
      pictures: plan.pictures?.map((name) => drawings[name]),
      askUs: plan.askUs,
      from: addDays(this.#day, from),
      to: addDays(this.#day, to),
    });
  }

  async #confirm(order: Order): Promise<void> {
    await order.reload();
    await confirmOrder(this.#deps, {
      order,
      revision: await loadCurrentRevision(order),
      actor: this.#staff.noor,
      rowVersion: order.rowVersion,
      note: '',
    });
  }

  async #mark(order: Order, action: 'start' | 'ready', actor: Staff): Promise<void> {
    await order.reload();
    await markOrder(this.#deps, { order, action, actor, rowVersion: order.rowVersion });
  }

  /** An instant of the studio's day, so many days from today. */
  #at(days: number, minute: number): Date {
    return instantAt(addDays(this.#day, days), minute, this.#zone);
  }
}

function hoursAfter(instant: Date, hours: number): Date {
  return new Date(instant.getTime() + hours * 3_600_000);
}

function earlier(one: Date, other: Date): Date {
  return one < other ? one : other;
}
