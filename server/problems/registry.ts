import type { Family } from './family.ts';
import { areaCircleFamily } from './families/area/area-circle.ts';
import { areaLShapeFamily } from './families/area/area-l-shape.ts';
import { areaRectangleLessFamily } from './families/area/area-rectangle-less.ts';
import { areaRectangleFamily } from './families/area/area-rectangle.ts';
import { areaTriangleFamily } from './families/area/area-triangle.ts';
import { boomGpaFamily } from './families/boom/boom-gpa.ts';
import { boomSpeedFamily } from './families/boom/boom-speed.ts';
import { chooseEquipmentFamily } from './families/equipment/choose-equipment.ts';
import { hand128thFamily } from './families/handheld/hand-128th.ts';
import { handTestPlotFamily } from './families/handheld/hand-test-plot.ts';
import { mixingOrderFamily } from './families/mixing/mixing-order.ts';
import { nozzlePatternFamily } from './families/nozzle/nozzle-pattern.ts';
import { rateLabelBaseFamily } from './families/rate/rate-label-base.ts';
import { ratePer1000Family } from './families/rate/rate-per-1000.ts';
import { ratePerAcreFamily } from './families/rate/rate-per-acre.ts';
import { spotPerGallonFamily } from './families/spot/spot-per-gallon.ts';
import { spotWaterTestFamily } from './families/spot/spot-water-test.ts';
import { spreaderNeedFamily } from './families/spreader/spreader-need.ts';
import { strengthPercentVolumeFamily } from './families/strength/strength-percent-volume.ts';
import { tankLoadsFamily } from './families/tank/tank-loads.ts';
import { unitToolFamily } from './families/units/unit-tool.ts';
import { unitVolumeFamily } from './families/units/unit-volume.ts';

// One line a family: import it here and add it to the list. Old versions stay listed below the current ones.

const current: readonly Family<unknown>[] = [
  areaRectangleFamily,
  areaRectangleLessFamily,
  areaLShapeFamily,
  areaTriangleFamily,
  areaCircleFamily,
  unitVolumeFamily,
  unitToolFamily,
  ratePer1000Family,
  rateLabelBaseFamily,
  ratePerAcreFamily,
  spotPerGallonFamily,
  spotWaterTestFamily,
  strengthPercentVolumeFamily,
  hand128thFamily,
  handTestPlotFamily,
  boomSpeedFamily,
  boomGpaFamily,
  spreaderNeedFamily,
  tankLoadsFamily,
  nozzlePatternFamily,
  chooseEquipmentFamily,
  mixingOrderFamily,
];
const old: readonly Family<unknown>[] = [];

const byKey = new Map<string, Family<unknown>>();
const byVersion = new Map<string, Family<unknown>>();
for (const family of current) {
  if (byKey.has(family.key)) throw new Error(`two families are called ${family.key}`);
  byKey.set(family.key, family);
  byVersion.set(`${family.key}@${family.version}`, family);
}
for (const family of old) byVersion.set(`${family.key}@${family.version}`, family);

/** All current families, in the order of the registry. */
export const families: readonly Family<unknown>[] = [...byKey.values()];

/** The current version of a family; undefined when there is none of this name. */
export function familyByKey(key: string): Family<unknown> | undefined {
  return byKey.get(key);
}

/** A family in a given version, old ones included; undefined when there is none. */
export function familyVersion(key: string, version: number): Family<unknown> | undefined {
  return byVersion.get(`${key}@${version}`);
}
