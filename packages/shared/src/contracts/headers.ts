/**
 * Every request that may change something carries this header, with any value: a form on another
 * site cannot set it, so its absence gives a forged request away (beside the Origin).
 */
export const guardHeader = 'X-Tierwell';

/** Sending the same thing twice under one key is one order. */
export const idempotencyHeader = 'Idempotency-Key';
