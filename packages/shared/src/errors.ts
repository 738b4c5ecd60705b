/**
 * Every way a request can be refused, by one closed list of codes. The map from code to HTTP
 * status lives in the API alone; the title is what a person reads first.
 */
export const errorTitles = {
  'bad-request': 'That request could not be read',
  'invalid-input': 'Some answers need another look',
  'not-signed-in': 'Please sign in first',
  'second-factor-needed': 'Your second factor is still needed',
  'fresh-proof-needed': 'Please confirm it is you',
  'not-allowed': 'Your role may not do that',
  'wrong-origin': 'That request did not come from this site',
  'not-found': 'There is nothing here',
  'wrong-state': 'The order has moved on',
  'changed-meanwhile': 'Somebody changed this meanwhile',
  'still-used': 'Something still uses this',
  'date-gone': 'That date has just gone',
  'price-changed': 'The price has changed meanwhile',
  'advice-stop': 'Something about this cake must be settled first',
  'too-many-holds': 'You already have several requests waiting',
  'key-reused': 'That key was used for something else',
  'link-spent': 'This link has been used or has run out',
  'sign-in-failed': 'That e-mail address and password do not match',
  'provider-failed': 'The other service did not let you in',
  'too-large': 'That is larger than we can take',
  'unreadable-photo': 'That file is not a picture we can read',
  'too-many-photos': 'There are too many photos',
  'too-many-requests': 'That was too often; please wait a little',
  unavailable: 'That part is out of reach just now',
  internal: 'Something went wrong on our side',
} as const;

export type ErrorCode = keyof typeof errorTitles;
