import { planOf, type CutPlan, type CutWork } from '../../shared/cut-work';
export function planTaperEngrave(work: CutWork<'taper-engrave'>): CutPlan {
  return planOf(work, []);
}
