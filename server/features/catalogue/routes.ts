import { z } from 'zod';
import { engineCatalogue, engineCatalogueHash } from '../../catalogue.ts';
import { defineRoutes, route } from '../../http/route.ts';

const records = z.array(z.looseObject({ name: z.string() }));
const catalogueResponse = z.object({
  boltSizes: records,
  boltGrades: records,
  steels: records,
  electrodes: records,
  sections: records,
});

/** A record as it stands, whatever else than a name its kind has. */
const whole = (record: { readonly name: string }): Record<string, unknown> & { name: string } => ({
  ...record,
});

export const routes = defineRoutes('catalogue', [
  route({
    method: 'get',
    path: '/api/catalogue',
    summary: 'Bolts, steels, weld metals and sections that details are made of',
    who: 'signed-in',
    response: catalogueResponse,
    cache: 'revalidate',
    handler: ({ etag }) => {
      etag(engineCatalogueHash());
      const { boltSizes, boltGrades, steels, electrodes, sections } = engineCatalogue();
      return {
        boltSizes: boltSizes.map(whole),
        boltGrades: boltGrades.map(whole),
        steels: steels.map(whole),
        electrodes: electrodes.map(whole),
        sections: sections.map(whole),
      };
    },
  }),
]);
