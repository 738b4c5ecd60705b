import ical, { ICalAlarmType, ICalCalendarMethod, ICalEventStatus } from 'ical-generator';

export type PickupForCalendar = {
  readonly studio: {
    readonly name: string;
    readonly street: string;
    readonly town: string;
    readonly region: string;
    readonly postcode: string;
    readonly phone: string;
    readonly email: string;
  };
  readonly order: { readonly number: number; readonly code: string; readonly rowVersion: number };
  readonly summary: string;
  readonly startAt: Date;
  readonly minutes: number;
  /** When the file is made. */
  readonly now: Date;
  /** Where the order can be seen; carries no key, since calendars are shared. */
  readonly url: string;
};

/**
 * The pickup as an iCalendar file (RFC 5545), attached to the confirming e-mail and offered on the
 * order's page. Times are in UTC, so that no reader needs our zone's rules; a later file of the
 * same order replaces it (same UID, higher SEQUENCE).
 */
export function calendarFile(pickup: PickupForCalendar): string {
  const { studio, order } = pickup;
  const calendar = ical({
    prodId: { company: 'Tierwell', product: 'Order book' },
    method: ICalCalendarMethod.PUBLISH,
  });
  const event = calendar.createEvent({
    id: `${order.code}@tierwell`,
    sequence: order.rowVersion,
    stamp: pickup.now,
    start: pickup.startAt,
    end: new Date(pickup.startAt.getTime() + pickup.minutes * 60_000),
    summary: `Collect your cake at ${studio.name}`,
    description: `Order No. ${order.number}: ${pickup.summary}.\nQuestions: ${studio.phone}, ${studio.email}`,
    location: `${studio.street}, ${studio.town}, ${studio.region} ${studio.postcode}`,
    url: pickup.url,
    status: ICalEventStatus.CONFIRMED,
  });
  event.createAlarm({
    type: ICalAlarmType.display,
    trigger: 2 * 3600,
    description: 'Cake to collect',
  });
  return calendar.toString();
}
