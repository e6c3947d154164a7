/**
 * Cautions that go wherever the figures go.
 *
 * Source: common practice, no source
 */
export const CAUTIONS = [
  'Preliminary sizes for comparing costs; not a design. A licensed engineer sizes and details the floor to the local code.',
  'Falsework is designed by a competent person; props and forms are struck on the engineer’s word.',
  'Nobody walks on unsupported blocks. Block ends are closed before concreting. Ribs are never cut for services.',
  'Surfaces are kept wet for at least seven days.',
] as const
