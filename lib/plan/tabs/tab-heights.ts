import type { Vec } from '@/lib/geometry/vec';
import type { Tabs } from '@/lib/job/cut-schema';
import type { TabPlace } from '@/lib/report/intent';
import type { FarDepth } from '../shared/cut-work';
import type { TabLift } from '../shared/height-run';
import { directionAt, pointAt, type Track } from '../shared/track';
import { tabFootprint, type PlacedTab } from './place-tabs';

/** A tab with its height: what the report says of it and how its track is lifted. */
export interface RaisedTab {
  readonly track: Track;
  readonly place: TabPlace;
  readonly lift: TabLift;
}

export interface TabRaise {
  readonly cut: string;
  readonly tabs: Tabs;
  readonly boardThickness: number;
  readonly cutterRadius: number;
  readonly farDepth: FarDepth;
}

/**
 * Gives a placed tab its height above the far face: the one asked for, or for `auto` the deepest that the far face's
 * cuts go within its footprint (wood length + cutter diameter along the track, cutter diameter wide) + the wood to hold.
 */
export function raiseTab(placed: PlacedTab, raise: TabRaise): RaisedTab {
  const { tabs, boardThickness, cutterRadius } = raise;
  const held = tabs.length + 2 * cutterRadius;
  const farDepth = raise.farDepth(tabFootprint(placed, held, cutterRadius));
  const auto = tabs.height === 'auto';
  const height = tabs.height === 'auto' ? Math.min(farDepth + tabs.hold, boardThickness) : tabs.height;
  const center = pointAt(placed.track, placed.along);
  const direction = directionAt(placed.track, placed.along);
  return {
    track: placed.track,
    place: {
      cut: raise.cut,
      outline: placed.outline.id,
      contour: placed.contour,
      fraction: placed.fraction,
      at: pair(placed.at),
      along: pair(direction),
      center: pair(center),
      length: tabs.length,
      height,
      hold: tabs.hold,
      slope: tabs.slope,
      farDepth,
      auto,
    },
    lift: { at: placed.along, half: held / 2, top: height - boardThickness, slope: tabs.slope },
  };
}

function pair({ x, y }: Vec): readonly [number, number] {
  return [x, y];
}
