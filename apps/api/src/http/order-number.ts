import * as z from 'zod/mini';

/** An order's number as it stands in an address. */
export const orderNumber = z.string().check(z.regex(/^\d{1,9}$/, 'An order has a number.'));
