import { useMutation } from '@tanstack/react-query';
import { z } from 'zod';
import { apiClient } from '@/lib/api-client';
import { type SignedIn } from '@/lib/api-model';
import { newPasswordField } from './fields';

/** What accepting an invitation takes, besides the token of its link. */
export const acceptInvitationSchema = z.object({
  name: z.string().trim().min(1, 'Type your name.').max(120),
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
