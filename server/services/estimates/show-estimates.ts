import { authorize } from '#server/policies/authorize.ts';
import { estimatePolicy } from '#server/policies/estimate-policy.ts';
import { presentEstimates } from '#server/presenters/estimates.ts';
import type { Scope } from '#server/services/people/load-scope.ts';
import type { EstimatesDto } from '#shared/schemas/estimate.ts';
import { loadBands, loadCheck, loadModels } from './load-estimates.ts';

/** How expected recall has turned out over the school. Three statements. @throws Problem 404 */
export async function showEstimates({ actor, school }: Scope): Promise<EstimatesDto> {
  authorize(estimatePolicy, 'read', actor, {});
  const check = await loadCheck(school.zone);
  const bands = await loadBands();
  const models = await loadModels(school.zone);
  return presentEstimates({ check, bands, models });
}
