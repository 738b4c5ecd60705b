/**
 * E-mails in the studio's own voice; all others are in the house's words. Gaps in braces are filled
 * with the order's facts.
 */
export const emailTexts: readonly {
  readonly template: string;
  readonly subject: string;
  readonly lead: string;
  readonly closing: string;
}[] = [
  {
    template: 'ready',
    subject: 'Order No. {number}: your cake is ready',
    lead: 'Hello {name},\n\nYour cake is boxed and waits for you in the cold. Ring the bell at the counter if nobody is there: we are by the oven.',
    closing: 'Have the order’s number with you: No. {number}. We wish you a lovely day.',
  },
  {
    template: 'ingredient-changed',
    subject: 'Order No. {number}: please read what has changed in your cake',
    lead: 'Hello {name},\n\nOne of the things we bake with is not what it was when you ordered, so what is in your cake for {day} has changed. Please read it, and tell whoever at your table it matters to.',
    closing:
      'If it does not suit somebody, ring us or answer this e-mail before we bake: there is nearly always another way. Ask a doctor what is right for somebody with an allergy.',
  },
  {
    template: 'thank-you',
    subject: 'Order No. {number}: thank you from the lane',
    lead: 'Hello {name},\n\nYour cake has left our counter. Thank you for letting us make it.',
    closing:
      'Send us a photo of the table if you like: the best ones hang by the oven. And if anything was not as it should be, tell us; that is how we get better.',
  },
];
