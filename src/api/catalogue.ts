import type { EngineCatalogue } from '@shared/engine/types.ts';
import { z } from 'zod';
import { get } from './http.ts';

const rows = z.array(z.looseObject({ name: z.string() }));

/** The server builds this from its own typed reference data; the shape is checked where the program would break. */
const catalogueResponse = z
  .object({ boltSizes: rows, boltGrades: rows, steels: rows, electrodes: rows, sections: rows })
  .transform((catalogue) => catalogue as unknown as EngineCatalogue);

export const fetchCatalogue = () => get(catalogueResponse, '/api/catalogue');
