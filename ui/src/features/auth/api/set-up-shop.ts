import { useMutation } from '@tanstack/react-query';
import { z } from 'zod';
import { apiClient } from '@/lib/api-client';
import { type SignedIn } from '@/lib/api-model';
import { emailField, newPasswordField } from './fields';

/** What the first start of an empty shop takes. */
export const setUpShopSchema = z.object({
  shopName: z.string().trim().min(1, 'Type the name of the shop.').max(120),
  name: z.string().trim().min(1, 'Type your name.').max(120),
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
