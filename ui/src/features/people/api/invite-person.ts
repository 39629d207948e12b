import { useMutation, useQueryClient } from '@tanstack/react-query';
import { z } from 'zod';
import { apiClient } from '@/lib/api-client';
import { type Person, ROLES } from '@/lib/api-model';

/** What inviting somebody takes. */
export const invitePersonSchema = z.object({
  name: z.string().trim().min(1, 'Type the person’s name.').max(120),
  email: z
    .string()
    .trim()
    .regex(/^[^\s@]+@[^\s@]+$/, 'Type an e-mail address, such as kim@shop.example.'),
  role: z.enum(ROLES),
});
export type InvitePersonInput = z.infer<typeof invitePersonSchema>;

export interface Invitation {
  person: Person;
  /** Address that lets the person in once. */
  invitationLink: string;
}

/** Invites somebody to the shop. */
export function useInvitePerson() {
  const client = useQueryClient();
  return useMutation({
    mutationFn: async (input: InvitePersonInput) =>
      (await apiClient.post<Invitation>('/people/invitations', input)).data,
    onSuccess: () => client.invalidateQueries({ queryKey: ['people'] }),
  });
}
