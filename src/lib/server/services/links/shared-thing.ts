import type { SharedThing } from '$lib/model/link/shown-by-link';
import { frozenConditionsSchema } from '$lib/model/team/frozen-conditions';
import type { CountData, DiagnoseOptions } from '$lib/stats/types';
import type { FoundLink } from './find-link';

/** All about the report of a link, as shownByLink takes it. */
export function sharedThing(found: FoundLink): SharedThing {
  return {
    team: { name: found.team },
    madeBy: found.madeBy,
    number: found.number,
    madeAt: found.madeAt,
    engineVersion: found.engineVersion,
    document: found.document,
    sha256: found.sha256,
    options: JSON.parse(found.options) as DiagnoseOptions,
    conditions: frozenConditionsSchema.parse(JSON.parse(found.conditions)),
    counts: JSON.parse(found.counts) as CountData
  };
}
