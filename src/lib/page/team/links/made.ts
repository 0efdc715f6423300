import type { LinkOptions } from '$lib/model/link/link-options';

/** A link that was just made, with the address that is told this once. */
export interface Made {
  id: string;
  address: string;
  /** Named people whom the mail did not reach. */
  missed: string[];
  options: LinkOptions;
}
