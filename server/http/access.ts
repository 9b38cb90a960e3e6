import type { AccessKey } from '../../shared/contracts/access.ts';
import type { Role } from '../../shared/vocabulary.ts';

/**
 * How far a permission reaches. `free`: the part open to all; `seat`: with a seat; `preview`: all, to look at;
 * `own`, `members`, `people`: one's own, those of one's cohorts, those of one's company; `summary`: levels, readiness
 * and completion only; `audited`: leaves a trace; `all`: without limit.
 */
export type Scope =
  'see' | 'free' | 'seat' | 'preview' | 'own' | 'members' | 'people' | 'summary' | 'audited' | 'join' | 'all';

export type Column = 'visitor' | Role;
export type AccessRow = Readonly<Record<Column, Scope | null>>;

/** Who may do what. The one place where it is written; every route names its row. */
export const access: Readonly<Record<AccessKey, AccessRow>> = {
  welcome: { visitor: 'see', trainee: 'see', instructor: 'see', manager: 'see', staff: 'see' },
  course: { visitor: 'free', trainee: 'seat', instructor: 'preview', manager: 'seat', staff: 'preview' },
  'own-work': { visitor: null, trainee: 'own', instructor: 'members', manager: 'summary', staff: 'audited' },
  'answers-of-others': { visitor: null, trainee: null, instructor: 'members', manager: null, staff: 'audited' },
  cohort: { visitor: null, trainee: 'join', instructor: 'members', manager: 'people', staff: 'all' },
  teaching: { visitor: null, trainee: null, instructor: 'members', manager: null, staff: 'all' },
  'questions-write': { visitor: null, trainee: null, instructor: 'all', manager: null, staff: 'all' },
  'questions-publish': { visitor: null, trainee: null, instructor: null, manager: null, staff: 'all' },
  company: { visitor: null, trainee: 'seat', instructor: null, manager: 'people', staff: 'all' },
  platform: { visitor: null, trainee: null, instructor: null, manager: null, staff: 'all' },
  'own-account': { visitor: null, trainee: 'own', instructor: 'own', manager: 'own', staff: 'own' },
  'proof-sheet': { visitor: null, trainee: null, instructor: null, manager: null, staff: 'all' },
  mailbox: { visitor: 'see', trainee: 'see', instructor: 'see', manager: 'see', staff: 'see' },
};

/** Anyone with roles; null is a visitor. */
export type Holder = { readonly roles: readonly Role[] } | null;

/** How far the person's roles reach for a capability; empty when it is not allowed at all. */
export function scopesOf(person: Holder, capability: AccessKey): Scope[] {
  const row = access[capability];
  const columns: readonly Column[] = person === null ? ['visitor'] : person.roles;
  return columns.flatMap((column) => row[column] ?? []);
}

export function may(person: Holder, capability: AccessKey): boolean {
  return scopesOf(person, capability).length > 0;
}
