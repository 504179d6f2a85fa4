import { BUILD } from '../lib/demo';
import { rebuildDossier } from '../lib/dossier';
import type { Rebuild } from '../lib/verify';

/** What verify is given to write a dossier again: it knows no writer itself, so that a writer's mistake is no secret. */
export const REBUILD: Rebuild = { writer: BUILD, build: rebuildDossier };
