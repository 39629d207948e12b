import { useMutation } from '@tanstack/react-query';
import * as z from 'zod/mini';
import { apiClient } from '@/lib/api-client';
import { type SignedIn } from '@/lib/api-model';

/** What signing in takes. */
export const signInSchema = z.object({
  email: z.string().check(z.trim(), z.minLength(1, 'Type your e-mail address.')),
  password: z.string().check(z.minLength(1, 'Type your password.')),
});
export type SignInInput = z.infer<typeof signInSchema>;

/** Signs a person in with e-mail address and password. */
export function useSignIn() {
  return useMutation({
    mutationFn: async (input: SignInInput) =>
      (await apiClient.post<SignedIn>('/auth/sign-in', input)).data,
  });
}
