import { useMutation } from '@tanstack/react-query';
import type { JoinRequest } from '#shared/contracts/people.ts';
import { session, type Session } from '#shared/contracts/session.ts';
import { callApi } from '../../../lib/call-api.ts';

const joinShop = (body: JoinRequest) => callApi({ method: 'POST', path: '/api/join', body, answer: session });

export const useJoinShop = (onJoined: (entered: Session) => void) =>
  useMutation({ mutationFn: joinShop, onSuccess: onJoined });
