import type { Check } from '../proof-context';
import { belowBed } from './below-bed';
import { cutOutTooEarly } from './cut-out-too-early';
import { cutterTooLongCut } from './cutter-too-long-cut';
import { outsideTravel } from './outside-travel';
import { partLoose } from './part-loose';
import { rapidInWood } from './rapid-in-wood';
import { tabThin } from './tab-thin';
import { tabWithoutWood } from './tab-without-wood';
import { turnMismatch } from './turn-mismatch';

/** Every check, in the order in which findings are told. */
export const CHECKS: readonly Check[] = [
  turnMismatch,
  outsideTravel,
  belowBed,
  cutterTooLongCut,
  rapidInWood,
  tabWithoutWood,
  tabThin,
  partLoose,
  cutOutTooEarly,
];
