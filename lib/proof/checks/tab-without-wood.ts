import { makeFinding } from '@/lib/report/make-finding';
import { cutById, mm, type Check, type MeasuredTab, type ProofContext } from '../proof-context';

/** Less wood than this is none, mm: it breaks before the part is out. */
export const NO_WOOD = 0.5;

/** Tabs with less than half a millimetre of wood under their top. */
export const tabWithoutWood: Check = (context) =>
  context.tabs
    .filter(({ wood }) => wood.height < NO_WOOD)
    .map((tab) => makeFinding('tab-without-wood', tabSentence(context, tab), tabPlace(context, tab)));

/** "Tab 1 of 'Rail' has 0.3 mm of wood left; 3 mm are asked for." */
export function tabSentence(context: ProofContext, tab: MeasuredTab): string {
  const { place, wood } = tab;
  const ofOutline = context.tabs.filter(
    (other) => other.place.cut === place.cut && other.place.outline === place.outline,
  );
  const number = ofOutline.indexOf(tab) + 1;
  const outline = context.job.outlines.find(({ id }) => id === place.outline);
  const name = outline?.name || place.outline;
  return `Tab ${number} of '${name}' has ${mm(wood.height)} of wood left; ${mm(place.hold)} are asked for.`;
}

/** Where a tab's finding stands. */
export function tabPlace({ job }: ProofContext, { place }: MeasuredTab) {
  const face = cutById(job, place.cut)?.face;
  return { cut: place.cut, ...(face && { face }), at: place.at };
}
