import { bunched } from './bunched';
import type { DemoFile } from './demo-file';
import { fortyShots } from './forty-shots';
import { hardCoreGas } from './hard-core-gas';
import { misreadKinks } from './misread-kinks';

/** The invented data that the guide walks through, each with a document in fixtures/guide. */
export const GUIDE_CASES = [bunched, hardCoreGas, misreadKinks, fortyShots] satisfies DemoFile[];
