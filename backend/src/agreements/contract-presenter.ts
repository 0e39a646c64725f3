import type { Contract } from '#shared/agreements/contract';

export const presentContract = ({ parts, ...contract }: Contract) => ({
  ...contract,
  parts: parts.map(({ choice, taxes, exemptions, plan, stageNames, ...part }) => ({
    ...part,
    choice: [...choice],
    taxes: [...taxes],
    exemptions: [...exemptions],
    plan: { ...plan, stages_percent: [...plan.stages_percent] },
    stageNames: [...stageNames],
  })),
});
