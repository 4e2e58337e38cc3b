/** The eight families of calculators, in the order of the row above them. */
export const FAMILIES = [
  { path: 'conversions', name: 'Conversions', about: 'dBm, watts and volts in any resistance' },
  { path: 'readings', name: 'Readings', about: 'what an instrument shows, as a level and how sure it is' },
  { path: 'mixing', name: 'Mixing', about: 'every product of a mixer against the filter after it' },
  { path: 'pads', name: 'Pads', about: 'attenuators from parts you can buy' },
  { path: 'chain', name: 'Chain', about: 'level, noise and headroom from stage to stage' },
  { path: 'filters', name: 'Filters', about: 'ladders and resonators as your parts will make them' },
  {
    path: 'matching',
    name: 'Matching and windings',
    about: 'return loss, L-networks, turns and resonance',
  },
  {
    path: 'guards',
    name: 'Guards and limits',
    about: 'instruments, bands, spurious emissions, exposure and heat',
  },
] as const;

export type Family = (typeof FAMILIES)[number]['path'];

export const familyName = (family: Family): string =>
  FAMILIES.find(({ path }) => path === family)?.name ?? '';

export const familyPath = (family: Family): string => `/level-bench/${family}`;
