/**
 * What a mail says, before it is either HTML or plain text: every template is written once, in
 * these pieces, and both forms are made from them.
 */
export type Block =
  /** Paragraphs, divided by empty lines. */
  | { readonly kind: 'text'; readonly text: string }
  | { readonly kind: 'heading'; readonly text: string }
  /** What is due now (`now`), must be known (`stop`), or is simply good to know (`quiet`). */
  | {
      readonly kind: 'notice';
      readonly tone: NoticeTone;
      readonly title: string;
      readonly text: string;
    }
  | { readonly kind: 'facts'; readonly facts: readonly Fact[] }
  | { readonly kind: 'prices'; readonly lines: readonly Fact[]; readonly total: Fact }
  | { readonly kind: 'button'; readonly label: string; readonly url: string }
  | { readonly kind: 'list'; readonly items: readonly ListItem[] }
  /** Somebody's own words. */
  | { readonly kind: 'quote'; readonly by: string; readonly text: string }
  /** The cake to scale; HTML only, since the words say what it is. */
  | { readonly kind: 'drawing'; readonly tiers: readonly DrawnTier[]; readonly label: string };

export type NoticeTone = 'now' | 'stop' | 'quiet';

export type Fact = { readonly label: string; readonly value: string };

export type ListItem = { readonly text: string; readonly url?: string };

/** A tier as it is seen from the side, the lowest first. */
export type DrawnTier = {
  readonly widthMm: number;
  readonly heightMm: number;
  /** `#rrggbb` */
  readonly colour: string;
};

/** What a template makes of its data; subject, lead and closing are the studio's words. */
export type MailBody = {
  readonly title: string;
  /** What inboxes show after the subject. */
  readonly preview: string;
  /** Values for `{name}` and the like in the words. */
  readonly fill: Readonly<Record<string, string>>;
  readonly blocks: readonly Block[];
  /** The order it is about, named at the head and linked at the foot. */
  readonly order?: { readonly number: number; readonly link: string };
  /** Why this address got it, where that is not plain. */
  readonly footnote?: string;
};

export const text = (words: string): Block => ({ kind: 'text', text: words });
export const heading = (words: string): Block => ({ kind: 'heading', text: words });
export const button = (label: string, url: string): Block => ({ kind: 'button', label, url });
export const facts = (...rows: readonly (Fact | null)[]): Block => ({
  kind: 'facts',
  facts: rows.filter((row) => row !== null),
});
export const fact = (label: string, value: string): Fact => ({ label, value });
export const notice = (tone: NoticeTone, title: string, words: string): Block => ({
  kind: 'notice',
  tone,
  title,
  text: words,
});
