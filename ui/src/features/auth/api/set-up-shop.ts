import { useMutation } from '@tanstack/react-query';
import * as z from 'zod/mini';
import { apiClient } from '@/lib/api-client';
import { type SignedIn } from '@/lib/api-model';
import { emailField, newPasswordField } from './fields';

/** What the first start of an empty shop takes. */
export const setUpShopSchema = z.object({
  shopName: z
    .string()
    .check(z.trim(), z.minLength(1, 'Type the name of the shop.'), z.maxLength(120)),
  name: z.string().check(z.trim(), z.minLength(1, 'Type your name.'), z.maxLength(120)),
  email: emailField,
  password: newPasswordField,
});
export type SetUpShopInput = z.infer<typeof setUpShopSchema>;

/** Makes the shop and its owner; works only while there are no people. */
export function useSetUpShop() {
  return useMutation({
    mutationFn: async (input: SetUpShopInput) =>
      (await apiClient.post<SignedIn>('/auth/setup', input)).data,
  });
}
