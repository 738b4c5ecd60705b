import type { AllergenEntry, StudioCard } from '#shared/contracts/menu.ts';
import type { Studio } from '#api/db/models/studio.ts';

/** The studio as everyone may read it. */
export function presentStudioCard(studio: Studio, handles: AllergenEntry[]): StudioCard {
  return {
    name: studio.name,
    street: studio.street,
    town: studio.town,
    region: studio.region,
    postcode: studio.postcode,
    country: studio.country,
    phone: studio.phone,
    email: studio.email,
    zone: studio.zone,
    currency: studio.currency,
    labelRegion: studio.labelRegion,
    temperatureLead: studio.temperatureLead,
    lengthLead: studio.lengthLead,
    locale: studio.locale,
    answerHours: studio.answerHours,
    guestHoldMinutes: studio.guestHoldMinutes,
    bookOpenMonths: studio.bookOpenMonths,
    monthlyWarmestC: studio.monthlyWarmestC,
    dessertFactorPpm: studio.dessertFactorPpm,
    kitchenNotice: studio.kitchenNotice,
    homeKitchenText: studio.homeKitchenText,
    eggAdvisory: studio.eggAdvisory,
    handles,
  };
}
