import type { TypedClaim } from '$lib/model/claim/check-claim';

/** One line of the form, as typed. */
export interface ClaimFields extends TypedClaim {
  key: number;
  /** Id of the quantity. */
  quantity: string;
}

export const freshClaim = (key: number, quantity: string): ClaimFields => ({
  key,
  quantity,
  value: '',
  uncertainty: '',
  kind: 'one-sigma'
});
