import { useMutation } from '@tanstack/react-query';
import type { ForgotPasswordRequest } from '#shared/contracts/session.ts';
import { callApi } from '../../../lib/call-api.ts';

const forgotPassword = (body: ForgotPasswordRequest) => callApi({ method: 'POST', path: '/api/forgot-password', body });

export const useForgotPassword = () => useMutation({ mutationFn: forgotPassword });
