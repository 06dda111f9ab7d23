import { useMutation, useQueryClient } from '@tanstack/react-query';
import { shop, type ShopChange } from '#shared/contracts/session.ts';
import { callApi } from '../../../lib/call-api.ts';

const changeShop = (body: ShopChange) => callApi({ method: 'PATCH', path: '/api/shop', body, answer: shop });

export function useChangeShop() {
  const client = useQueryClient();
  return useMutation({ mutationFn: changeShop, onSuccess: () => client.invalidateQueries({ queryKey: ['session'] }) });
}
