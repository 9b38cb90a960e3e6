import type { Text, Tier } from '../../../../shared/vocabulary.ts';
import type { Rng } from '../../rng.ts';
import type { Equipment } from './equipment-names.ts';

/** A wrong choice, the slip that leads to it and its reason. */
export interface WrongChoice {
  readonly equipment: Equipment;
  readonly slip: string;
  readonly reason: Text;
}

/** One case of a rule, with its numbers. */
export interface EquipmentCase {
  /** The job, told after an opening sentence. */
  readonly job: Text;
  readonly right: Equipment;
  readonly why: Text;
  readonly wrong: readonly WrongChoice[];
}

/** One row of the rule table: site, size, form of product and target decide. The number drawn gives the size. */
export interface EquipmentRule {
  readonly key: string;
  readonly tier: Tier;
  /** Only where a place has wide open turf. */
  readonly largeGrounds?: boolean;
  /** A number that sizes the job: square feet, acres, feet. */
  readonly size: (rng: Rng) => number;
  /** Ways of telling it; the case is the same. */
  readonly tellings: number;
  readonly at: (size: number, telling: number) => EquipmentCase;
}
