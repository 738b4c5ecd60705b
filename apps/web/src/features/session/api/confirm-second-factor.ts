import { useMutation } from '@tanstack/react-query';
import { type SecondFactorCode, recoveryCodes } from '#shared/contracts/accounts.ts';
import { request } from '#web/lib/http.ts';

/** Confirms the enrolment; answers the recovery codes, once. */
export function confirmSecondFactor(body: SecondFactorCode) {
  return request({
    method: 'POST',
    path: '/api/session/second-factor/enrolment/confirm',
    body,
    answer: recoveryCodes,
  });
}

export function useConfirmSecondFactor() {
  return useMutation({ mutationFn: confirmSecondFactor });
}
