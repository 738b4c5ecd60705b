import type { LabelRegion } from '#shared/contracts/vocabulary.ts';
import type { LengthLead, TemperatureLead } from '#shared/kitchen/measures.ts';
import type { MailTemplate } from './mail-data.ts';
import type { MailWords } from './words.ts';

/** What every mail of the studio carries and is written by. */
export type House = {
  readonly studio: {
    readonly name: string;
    /** On one line. */
    readonly address: string;
    readonly phone: string;
    readonly email: string;
    /** IANA name; instants are told in it. */
    readonly zone: string;
    readonly locale: string;
    readonly labelRegion: LabelRegion;
    readonly temperatureLead: TemperatureLead;
    readonly lengthLead: LengthLead;
  };
  /** Where people reach the studio, without a slash at the end. */
  readonly publicUrl: string;
  /** The studio's own words, where it has written some in place of the house's. */
  readonly words: Partial<Record<MailTemplate, MailWords>>;
};
