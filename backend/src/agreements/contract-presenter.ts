import type { Contract } from '#shared/agreements/contract';

export const presentContract = ({ parts, ...contract }: Contract) => ({
  ...contract,
  parts: parts.map(({ choice, taxes, plan, stageNames, ...part }) => ({
    ...part,
    choice: [...choice],
    taxes: [...taxes],
    plan: { ...plan, stages_percent: [...plan.stages_percent] },
    stageNames: [...stageNames],
  })),
});
