import { useMutation } from '@tanstack/react-query';
import { secondFactorEnrolment } from '#shared/contracts/accounts.ts';
import { request } from '#web/lib/http.ts';

/** A new secret for the authenticator, to be confirmed by a code of it. */
export function enrolSecondFactor() {
  return request({
    method: 'POST',
    path: '/api/session/second-factor/enrolment',
    answer: secondFactorEnrolment,
  });
}

export function useEnrolSecondFactor() {
  return useMutation({ mutationFn: enrolSecondFactor });
}
