import { useMutation, useQueryClient } from '@tanstack/react-query';
import * as z from 'zod/mini';
import { apiClient } from '@/lib/api-client';
import { type Person, ROLES } from '@/lib/api-model';

/** What inviting somebody takes. */
export const invitePersonSchema = z.object({
  name: z.string().check(z.trim(), z.minLength(1, 'Type the person’s name.'), z.maxLength(120)),
  email: z
    .string()
    .check(
      z.trim(),
      z.regex(/^[^\s@]+@[^\s@]+$/, 'Type an e-mail address, such as kim@shop.example.'),
    ),
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
