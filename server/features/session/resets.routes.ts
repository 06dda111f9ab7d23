import { Router } from 'express';
import type { Logger } from 'pino';
import { forgotPasswordRequest, resetPasswordRequest } from '#shared/contracts/session.ts';
import { originOf } from '../../http/origin-of.ts';
import { readBody } from '../../http/read-input.ts';
import { hashToken } from '../../secret-token.ts';
import type { ResetsService } from './resets.service.ts';
import type { SignInBrake } from './sign-in-brake.ts';

interface Given {
  readonly service: ResetsService;
  /** Counts asking for a link. */
  readonly askBrake: SignInBrake;
  /** Counts tries with a link. */
  readonly linkBrake: SignInBrake;
  readonly publicUrl: string | undefined;
  readonly log: Logger;
}

/** Forgotten passwords. */
export function resetsRoutes({ service, askBrake, linkBrake, publicUrl, log }: Given): Router {
  const router = Router();

  router.post('/forgot-password', (req, res) => {
    const { email } = readBody(req, forgotPasswordRequest);
    askBrake.begin(email, req.ip ?? 'unknown');
    const origin = originOf(req, publicUrl);
    // Answered first: otherwise the time would tell whether the address has an account.
    res.status(204).end();
    service.sendLink(email, origin).catch((error: unknown) => log.error({ err: error }, 'a reset link was not mailed'));
  });

  router.post('/reset-password', async (req, res) => {
    const request = readBody(req, resetPasswordRequest);
    const tried = hashToken(request.token);
    const address = req.ip ?? 'unknown';
    linkBrake.begin(tried, address);
    await service.reset(request);
    linkBrake.succeeded(tried, address);
    res.status(204).end();
  });

  return router;
}
