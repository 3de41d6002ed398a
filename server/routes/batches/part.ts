import { overstepOf } from '#shared/chain/shares.ts';
import { overstepWords } from '#shared/chain/shareWords.ts';
import { invalidField } from '../../problems.ts';
import type { Hand } from '../board/hand.ts';

/** The parts of a cake that several worts share are together no more than the cake. */
export function demandPart({ board, member }: Hand, laterId: string, keepL: number): void {
  const over = overstepOf(board, laterId, keepL);
  if (over) throw invalidField('/keepL', overstepWords(over, member.person.units));
}
