import { EmailText } from '#api/db/models/email-text.ts';
import { Studio } from '#api/db/models/studio.ts';
import type { House } from '#api/mail/house.ts';
import { mailTemplate } from '#api/mail/words.ts';
import type { Deps } from '#api/modules/deps.ts';

/** What every mail carries: the studio as it is now, and its own words where it has written some. */
export async function loadHouse({ env }: Pick<Deps, 'env'>): Promise<House> {
  const [studio, texts] = await Promise.all([
    Studio.findByPk(1, { rejectOnEmpty: true }),
    EmailText.findAll(),
  ]);
  const { name, street, town, region, postcode, phone, email, zone, locale } = studio;
  const { labelRegion, temperatureLead, lengthLead } = studio;
  return {
    studio: {
      name,
      address: [street, town, `${region} ${postcode}`.trim()].filter((it) => it !== '').join(', '),
      phone,
      email,
      zone,
      locale,
      labelRegion,
      temperatureLead,
      lengthLead,
    },
    publicUrl: env.publicUrl,
    words: wordsOf(texts),
  };
}

function wordsOf(texts: readonly EmailText[]): House['words'] {
  const words: House['words'] = {};
  for (const { template, subject, lead, closing } of texts) {
    const known = mailTemplate.safeParse(template);
    if (known.success) words[known.data] = { subject, lead, closing };
  }
  return words;
}
