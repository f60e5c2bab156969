import { acceptPasswordResetSchema, requestPasswordResetSchema } from '../schemas/people';
import { endpoint } from './endpoint';

/** What a person does about his account before he is signed in. */
export const accountEndpoints = {
  requestPasswordReset: endpoint({
    method: 'POST',
    path: '/password-resets',
    summary: 'Have a link mailed for a new password; the answer is the same whether or not there is such an account',
    access: 'open',
    body: requestPasswordResetSchema,
    success: 204,
  }),
  acceptPasswordReset: endpoint({
    method: 'POST',
    path: '/password-resets/acceptances',
    summary: 'Choose a new password with a mailed link; all sessions end',
    access: 'open',
    body: acceptPasswordResetSchema,
    success: 204,
  }),
} as const;
