import { places } from '../situations.ts';

/** Places that would have a sports field or other wide turf. */
export const placesWithField = places.filter(({ key }) =>
  ['school', 'community-center', 'park-lodge', 'office-park'].includes(key),
);
