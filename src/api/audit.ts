import { auditListResponse, auditVerificationResponse } from '@shared/contracts/audit.ts';
import type { z } from 'zod';
import { get } from './http.ts';

export type AuditVerification = z.output<typeof auditVerificationResponse>;

/** Newest first; `before` continues after the last entry of the previous page. */
export const fetchAudit = (before?: number, count = 50) =>
  get(auditListResponse, '/api/audit', { query: { before, count } });

export const verifyAudit = () => get(auditVerificationResponse, '/api/audit/verification');
