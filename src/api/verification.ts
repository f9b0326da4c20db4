import { verificationResponse } from '@shared/contracts/verification.ts';
import { get } from './http.ts';

export const fetchVerification = (signal?: AbortSignal) =>
  get(verificationResponse, '/api/verification', signal ? { signal } : {});
