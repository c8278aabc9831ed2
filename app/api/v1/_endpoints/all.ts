import { readBuildArchiveEndpoint, readBuildEndpoint, readBuildFileEndpoint } from './builds';
import { deleteDraftEndpoint, putDraftEndpoint, readDraftEndpoint } from './drafts';
import type { Endpoint } from './Endpoint';
import { readMeEndpoint } from './people';
import { createRecipeEndpoint, listRecipesEndpoint, readRecipeEndpoint } from './recipes';
import {
  readConformanceKitEndpoint,
  readHealthEndpoint,
  readOpenApiEndpoint,
  readReadinessEndpoint,
} from './service';
import { listShowsEndpoint } from './shows';
import { createVersionEndpoint, listVersionsEndpoint, readVersionEndpoint } from './versions';

/** All of the API, in the order of its description. */
export const endpoints: readonly Endpoint[] = [
  readHealthEndpoint,
  readReadinessEndpoint,
  readOpenApiEndpoint,
  readConformanceKitEndpoint,
  readMeEndpoint,
  listShowsEndpoint,
  listRecipesEndpoint,
  createRecipeEndpoint,
  readRecipeEndpoint,
  readDraftEndpoint,
  putDraftEndpoint,
  deleteDraftEndpoint,
  listVersionsEndpoint,
  createVersionEndpoint,
  readVersionEndpoint,
  readBuildEndpoint,
  readBuildFileEndpoint,
  readBuildArchiveEndpoint,
];
