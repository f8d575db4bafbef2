import type { CutKind } from '@/lib/job/cut-schema';
import { planBore } from './kinds/bore';
import { planChamfer } from './kinds/chamfer';
import { planDrill } from './kinds/drill';
import { planEngrave } from './kinds/engrave';
import { planPocket } from './kinds/pocket/plan-pocket';
import { planProfile } from './kinds/profile';
import { planSurface } from './kinds/surface';
import { planTaperEngrave } from './kinds/taper-engrave/plan-taper-engrave';
import type { AnyCutWork, CutPlan, CutPlanner } from './shared/cut-work';

/** The planner of each kind of cut: a kind that is forgotten here does not compile. */
const PLANNERS: { readonly [Kind in CutKind]: CutPlanner<Kind> } = {
  pocket: planPocket,
  profile: planProfile,
  chamfer: planChamfer,
  engrave: planEngrave,
  'taper-engrave': planTaperEngrave,
  drill: planDrill,
  bore: planBore,
  surface: planSurface,
};

/** Plans one cut by the planner of its kind. */
export function planCut(work: AnyCutWork): CutPlan {
  // The table holds, kind by kind, the planner of the cut's own kind; the compiler cannot follow that through a look-up.
  const plan = PLANNERS[work.cut.kind] as (work: AnyCutWork) => CutPlan;
  return plan(work);
}
