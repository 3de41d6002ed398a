import type { RequestHandler } from 'express';
import { CONTRACT_HEADER, CONTRACTS, isContractTaken } from '#shared/api/contract.ts';
import type { Clock } from '../clock.ts';
import { problem } from '../problems.ts';

/**
 * Refuses what was written under a contract that ended too long ago. Who names none is a program,
 * and reads the OpenAPI document.
 */
export function demandContract(clock: Clock, contracts = CONTRACTS): RequestHandler {
  return (req, _res, next) => {
    const named = req.get(CONTRACT_HEADER);
    if (named === undefined) return next();
    const number = /^\d{1,6}$/.test(named) ? Number(named) : Number.NaN;
    next(isContractTaken(number, clock.now(), contracts) ? undefined : problem('contract-ended'));
  };
}
