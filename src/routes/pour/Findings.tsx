import type { Finding } from '#shared/rules/answer.ts';
import { useBrewery } from '../../app/useBrewery.ts';
import { FindingBlock } from '../board/panel/FindingBlock.tsx';

/** What a link says, worst first. */
export function Findings({ findings, laterId }: { findings: readonly Finding[]; laterId: string }) {
  const { path } = useBrewery();
  return findings.map((finding) => (
    <FindingBlock key={finding.rule} finding={finding} science={path(`science?link=${laterId}`)} />
  ));
}
