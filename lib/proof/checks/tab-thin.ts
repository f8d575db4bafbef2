import { makeFinding } from '@/lib/report/make-finding';
import type { Check } from '../proof-context';
import { NO_WOOD, tabPlace, tabSentence } from './tab-without-wood';

/** What rounding and sampling may take from a tab that is right, mm. */
const SLACK = 0.02;

/** Tabs with some wood but less than is asked for. */
export const tabThin: Check = (context) =>
  context.tabs
    .filter(({ wood, place }) => wood.height >= NO_WOOD && wood.height < place.hold - SLACK)
    .map((tab) => makeFinding('tab-thin', tabSentence(context, tab), tabPlace(context, tab)));
