/** The studio's first policies, in its own words; a change is a new version, never an edit. */
export const policies: readonly {
  readonly kind: 'privacy' | 'terms' | 'allergy' | 'cancellation' | 'photo';
  readonly title: string;
  readonly text: string;
}[] = [
  {
    kind: 'terms',
    title: 'How an order works',
    text: `Sending an order asks us for a cake; it does not yet buy one. The price you see is an estimate from what you chose. We look at every order ourselves and answer within two days. Your cake is promised once we have confirmed it, and from then on the price in the confirmation holds.

Where a day was shown as open we keep a place for you while you wait for our answer: half an hour at first, and two days once you have opened the link in our e-mail. If the place runs out, your request stays with us without a promised day, and we both get a note.

You collect the cake at 14 Oxbow Lane in the window you chose. Please tell us if somebody else comes. From the moment it leaves our counter, keep it level, cool and out of the sun; the care card that goes home with it says until when. Boards, dowels, wires, ribbons and anything else marked so come off before eating.

If something is wrong with your cake, write or call the same day, with a picture if you can, and we will put it right as the law asks and as we would want it done for us.`,
  },
  {
    kind: 'privacy',
    title: 'What we keep about you',
    text: `We keep what you give us to make your cake and hand it to the right person: names, how to reach you, what you ordered, what you wrote to us and the pictures you sent. We keep it with us, on our own server, and we do not sell it or show it to advertisers.

Pictures are saved again without the place and camera details that phones put into them; the file you sent is deleted at once.

Allergies and diets are about health, so we ask for your agreement before we keep them, show them only to the people who make and hand over your cake, and delete them when you ask. Orders stay in our books as long as tax law wants, with your name taken out once you ask us to.

You may have a copy of everything, have it put right, or have it erased: use your account page, the link in your e-mail, or write to hello@oxbowlane.example.`,
  },
  {
    kind: 'allergy',
    title: 'Allergies and what we handle',
    text: `We make everything in one kitchen that handles wheat, milk, egg, soy, almonds, hazelnuts, walnuts, pistachios and sesame every week. For each cake we list what is in it, worked out from the labels of what we buy, and what else is handled here. We never say more than that.

Tell us about every allergy at the table, even if you think the cake avoids it. If your cake contains what somebody cannot eat, the order says so at once and shows what else you could choose. With celiac disease or a severe allergy we talk with you before we take the order, and sometimes we will say no: please do not take it amiss.

Makers change their recipes. If a label changes after you ordered, we work out your cake again and tell you before you collect it. What is right for your guest is for them and their doctor to decide.`,
  },
  {
    kind: 'cancellation',
    title: 'Changing your mind',
    text: `Until we confirm, you can withdraw your order by yourself, free of charge, from the order's page.

After we confirm, tell us as soon as you know. Up to fourteen days before the pickup we charge nothing. From fourteen to four days before we charge a third, because sugar work is made ahead and the day was kept for you. Within the last three days we charge the whole price less what we can still save. If we have to cancel, you pay nothing and we help you find another cake.

Moving to another day is free whenever we have room on it.`,
  },
  {
    kind: 'photo',
    title: 'Pictures',
    text: `The pictures you send help us see what you mean. Please send only pictures you may share. We take ideas from them, never copies of another baker's design line for line, and for edible prints we need your word that you have the right to print it.

We like to show finished cakes. We do so only if you say yes on the last page of your order, never with your name or your guests, and you can take the yes back at any time.`,
  },
];
