import type { IncomingHttpHeaders } from 'node:http';
import type { Express, Request, Response } from 'express';
import type { AccessKey } from '../../shared/contracts/access.ts';
import { AppError } from '../../shared/errors.ts';
import { locales, type Locale } from '../../shared/vocabulary.ts';
import { scopesOf, type Scope } from './access.ts';
import { isOurs } from './origin.ts';
import { jsonBody, parsePart, type Parsed, type Schema } from './parse.ts';
import type { Person, Sessions } from './session.ts';

export type Method = 'get' | 'post' | 'put' | 'patch' | 'delete';

/** What a handler is given: who asks, and the parts of the request already parsed by their contracts. */
export interface Call<V extends boolean, P extends Schema, Q extends Schema, B extends Schema> {
  person: V extends true ? Person | null : Person;
  /** The language to answer in: the person's, or for a visitor what the browser asks for. */
  language: Locale;
  params: Parsed<P>;
  query: Parsed<Q>;
  body: Parsed<B>;
  headers: IncomingHttpHeaders;
  /** The caller's address, for limits. */
  address: string;
  setHeader: (name: string, value: string | readonly string[]) => void;
}

export interface RouteSpec<V extends boolean, P extends Schema, Q extends Schema, B extends Schema, R> {
  method: Method;
  /** The whole path with its parameters: `/api/drills/:drillId`. */
  path: string;
  /** The row of the access table that decides who may. */
  access: AccessKey;
  /** True lets visitors in where the row does; without it a person is required. */
  visitors?: V;
  /** Narrows the row to these reaches: creating a cohort is not for those who may only join one. */
  scopes?: readonly Scope[];
  /** True for the part that is open without a seat. */
  free?: boolean;
  params?: P;
  query?: Q;
  body?: B;
  /** The reply's contract. What it does not name does not leave. */
  reply?: Schema;
  /** Status of the reply; 200 unless given, 204 when the handler returns nothing. */
  status?: number;
  handler: (call: Call<V, P, Q, B>) => Promise<R> | R;
}

/** What opens the paid part. The one question "may this person use it?", answered by the account feature. */
export interface Entitlement {
  full: boolean;
}

export interface RouteDeps {
  sessions: Sessions;
  entitlement: (person: Person) => Entitlement | Promise<Entitlement>;
  /** Origins our pages are served from. */
  origins: readonly string[];
}

/** A declared route: what the registry knows of it, and how it runs. */
export interface Route {
  readonly method: Method;
  readonly path: string;
  readonly access: AccessKey;
  readonly visitors: boolean;
  readonly scopes: readonly Scope[] | null;
  readonly run: (request: Request, response: Response, deps: RouteDeps) => Promise<void>;
}

function languageOf(request: Request, person: Person | null): Locale {
  if (person) return person.language;
  return locales.find((locale) => locale === request.acceptsLanguages([...locales])) ?? 'en';
}

async function admit(
  spec: { access: AccessKey; visitors: boolean; scopes: readonly Scope[] | null; free: boolean },
  person: Person | null,
  deps: RouteDeps,
): Promise<void> {
  if (person === null && !spec.visitors) throw new AppError('not-signed-in');
  const reach = scopesOf(person, spec.access).filter((scope) => spec.scopes === null || spec.scopes.includes(scope));
  if (reach.length === 0) throw new AppError(person === null ? 'not-signed-in' : 'role-missing');
  const needsSeat =
    person !== null && !spec.free && spec.access === 'course' && reach.every((scope) => scope === 'seat');
  if (needsSeat && !(await deps.entitlement(person)).full) throw new AppError('seat-missing');
}

function send(response: Response, result: unknown, status: number | undefined): void {
  response.setHeader('Cache-Control', 'no-store');
  response.statusCode = status ?? (result === undefined ? 204 : 200);
  if (result === undefined) {
    response.end();
    return;
  }
  response.setHeader('Content-Type', 'application/json; charset=utf-8');
  response.end(JSON.stringify(result));
}

/**
 * The only way an API route is declared. In order: origin of a change, sign-in, role, seat, path, query, body; then the
 * handler, and its reply parsed by the contract. A bad path is 404, since there is nothing at it.
 */
export function route<
  R,
  V extends boolean = false,
  P extends Schema = undefined,
  Q extends Schema = undefined,
  B extends Schema = undefined,
>(spec: RouteSpec<V, P, Q, B, R>): Route {
  const { method, path, access, free = false } = spec;
  const visitors = spec.visitors === true;
  const scopes = spec.scopes ?? null;
  return {
    method,
    path,
    access,
    visitors,
    scopes,
    async run(request, response, deps) {
      if (method !== 'get' && !isOurs(request.headers, deps.origins)) throw new AppError('foreign-origin');
      const person = await deps.sessions.find(request.headers.cookie);
      await admit({ access, visitors, scopes, free }, person, deps);
      const result: unknown = await spec.handler({
        person: person as Call<V, P, Q, B>['person'],
        language: languageOf(request, person),
        params: parsePart(spec.params as P, request.params, 'not-found'),
        query: parsePart(spec.query as Q, request.query, 'bad-query'),
        body:
          spec.body === undefined ? (undefined as Parsed<B>) : parsePart(spec.body as B, jsonBody(request), 'bad-body'),
        headers: request.headers,
        address: request.ip ?? '',
        setHeader: (name, value) => void response.setHeader(name, value),
      });
      send(response, spec.reply === undefined || result === undefined ? result : spec.reply.parse(result), spec.status);
    },
  };
}

/** Registers declared routes; two for the same method and path are a mistake. */
export function mountRoutes(app: Express, routes: readonly Route[], deps: RouteDeps): void {
  const seen = new Set<string>();
  for (const one of routes) {
    const key = `${one.method} ${one.path}`;
    if (seen.has(key)) throw new Error(`The route "${key}" is declared twice.`);
    seen.add(key);
    app[one.method](one.path, (request, response) => one.run(request, response, deps));
  }
}
