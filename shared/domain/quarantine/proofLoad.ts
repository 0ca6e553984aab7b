import type { KindAndSpec } from '../slings/spec';

/**
 * Proof load that a repaired sling must have carried, in kg; null where the kind is never repaired.
 * Chain: 2 × the vertical rated load of a leg (29 CFR 1910.184(e)(4) with 8 CCR 5044; trade facts 1.7).
 * Mesh: 1.5 × by 29 CFR 1910.184(g)(5), 2 × by ASME B30.9 (from memory); the stricter wins.
 */
export function requiredProofLoadKg(sling: KindAndSpec, verticalKg: number): number | null {
  if (sling.kind === 'alloy-chain' || sling.kind === 'metal-mesh') return 2 * verticalKg;
  return null;
}
