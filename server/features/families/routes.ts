import { familyParamsSchema, proofQuerySchema } from '../../../shared/contracts/families.ts';
import { route, type Route } from '../../http/route.ts';
import type { FamilyService } from './service.ts';

/** The authors' proof sheets: answers and slips in full, so staff only. */
export function familyRoutes(families: FamilyService): Route[] {
  return [
    route({
      method: 'get',
      path: '/api/staff/families',
      access: 'proof-sheet',
      handler: ({ language }) => families.list(language),
    }),
    route({
      method: 'get',
      path: '/api/staff/families/:family',
      access: 'proof-sheet',
      params: familyParamsSchema,
      query: proofQuerySchema,
      handler: ({ params, query, language }) => families.proof(params.family, query, language),
    }),
  ];
}
