import { type FieldErrors, type Resolver, set } from 'react-hook-form';
import { issuesOf } from '../steps/check-step.ts';
import type { OrderForm } from './empty-order.ts';

/** The contract as the form's resolver: every issue on its field, by path. */
export const orderResolver: Resolver<OrderForm> = (values) => {
  const issues = issuesOf(values);
  if (issues.length === 0) return { values, errors: {} };
  const errors: FieldErrors<OrderForm> = {};
  for (const { path, message } of issues) set(errors, path, { type: 'contract', message });
  return { values: {}, errors };
};
