import type { Text } from '../../../../shared/vocabulary.ts';
import type { NamedPattern } from './pattern-names.ts';

/** One row of the rule tables: what is told, the pattern it calls for, and why each other one is wrong. */
export interface PatternRule {
  readonly key: string;
  readonly right: NamedPattern;
  readonly why: Text;
  /** Ways of telling it. */
  readonly told: readonly Text[];
  /** Three or more. */
  readonly wrong: readonly { readonly pattern: NamedPattern; readonly slip: string; readonly reason: Text }[];
}
