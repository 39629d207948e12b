import { useMutation } from '@tanstack/react-query';
import * as z from 'zod/mini';
import { apiClient } from '@/lib/api-client';
import { type SignedIn } from '@/lib/api-model';
import { newPasswordField } from './fields';

/** What accepting an invitation takes, besides the token of its link. */
export const acceptInvitationSchema = z.object({
  name: z.string().check(z.trim(), z.minLength(1, 'Type your name.'), z.maxLength(120)),
  password: newPasswordField,
});
export type AcceptInvitationInput = z.infer<typeof acceptInvitationSchema>;

/** Accepts an invitation and signs the person in. */
export function useAcceptInvitation(token: string) {
  return useMutation({
    mutationFn: async (input: AcceptInvitationInput) =>
      (await apiClient.post<SignedIn>('/auth/accept-invitation', { token, ...input })).data,
  });
}
