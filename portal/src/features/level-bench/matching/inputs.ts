import { choice, optional, quantity, type BenchValues } from '../inputs/fields';

const WINDINGS = ['core', 'l-network'] as const;

/**
 * Every calculation of the page; those that ask for the same thing share its field. They start at the club plan's
 * 20 m: the coil of its low-pass filter, 13 turns of 4.2 nH each squared.
 */
export const INPUTS = {
  calculation: choice(
    'Calculation',
    [
      { value: 'match', label: 'Return loss and VSWR' },
      { value: 'l-network', label: 'L-network' },
      { value: 'core', label: 'Turns on a core' },
      { value: 'air', label: 'Coil of one layer in air' },
      { value: 'resonance', label: 'Resonance and Q' },
      { value: 'skin', label: 'Skin depth' },
      { value: 'flux', label: 'Flux in a core' },
    ],
    'match',
  ),
  known: choice(
    'What is known',
    [
      { value: 'returnLossDb', label: 'Return loss' },
      { value: 'vswr', label: 'VSWR' },
      { value: 'reflection', label: 'Reflection coefficient' },
      { value: 'mismatchLossDb', label: 'Mismatch loss' },
      { value: 'impedance', label: 'Impedance' },
    ],
    'returnLossDb',
    { when: { calculation: ['match'] } },
  ),
  returnLossDb: quantity('Return loss', 'dB', '14', {
    when: { calculation: ['match'], known: ['returnLossDb'] },
  }),
  vswr: quantity('VSWR', '', '1.5', { unitWords: 'to 1', when: { calculation: ['match'], known: ['vswr'] } }),
  reflection: quantity('Reflection coefficient', '', '0.2', {
    unitWords: '0 to 1',
    when: { calculation: ['match'], known: ['reflection'] },
  }),
  mismatchLossDb: quantity('Mismatch loss', 'dB', '0.2', {
    when: { calculation: ['match'], known: ['mismatchLossDb'] },
  }),
  loadOhms: quantity('Load, resistance', 'ohm', '75', {
    when: { calculation: ['match'], known: ['impedance'] },
  }),
  loadReactanceOhms: quantity('Load, reactance', 'ohm', '0', {
    when: { calculation: ['match'], known: ['impedance'] },
  }),
  lineOhms: quantity('Line', 'ohm', '50', { when: { calculation: ['match'], known: ['impedance'] } }),
  facingDb: quantity('Return loss facing it', 'dB', '20', { when: { calculation: ['match'] } }),
  sourceOhms: quantity('From', 'ohm', '50', { when: { calculation: ['l-network'] } }),
  resistanceOhms: quantity('To, resistance', 'ohm', '12.5', { when: { calculation: ['l-network'] } }),
  reactanceOhms: quantity('To, reactance', 'ohm', '0', { when: { calculation: ['l-network'] } }),
  find: choice(
    'To find',
    [
      { value: 'frequency', label: 'Frequency' },
      { value: 'henries', label: 'Coil' },
      { value: 'farads', label: 'Capacitor' },
    ],
    'farads',
    { when: { calculation: ['resonance'] } },
  ),
  findOfCoil: choice(
    'To find',
    [
      { value: 'turns', label: 'Turns' },
      { value: 'henries', label: 'Inductance' },
    ],
    'turns',
    { when: { calculation: ['air'] } },
  ),
  frequencyHertz: quantity('Frequency', 'MHz', '14.2', {
    when: { calculation: ['l-network', 'skin', 'flux'] },
  }),
  centreHertz: quantity('Frequency', 'MHz', '14.2', {
    when: { calculation: ['resonance'], find: ['henries', 'farads'] },
  }),
  henries: quantity('Inductance', 'nH', '705', { when: { calculation: ['core'] } }),
  coilHenries: quantity('Inductance', 'nH', '705', { when: { calculation: ['air'], findOfCoil: ['turns'] } }),
  resonantHenries: quantity('Coil', 'nH', '705', {
    when: { calculation: ['resonance'], find: ['frequency', 'farads'] },
  }),
  farads: quantity('Capacitor', 'pF', '180', {
    when: { calculation: ['resonance'], find: ['frequency', 'henries'] },
  }),
  al: choice(
    'AL of the core, told in',
    [
      { value: 'nH', label: 'nH for one turn squared' },
      { value: 'uH', label: 'µH for 100 turns' },
      { value: 'mH', label: 'mH for 1,000 turns' },
    ],
    'nH',
    { when: { calculation: WINDINGS } },
  ),
  alNanohenry: quantity('AL', '', '4.2', {
    unitWords: 'nH/turn²',
    when: { calculation: WINDINGS, al: ['nH'] },
  }),
  microhenries: quantity('AL', '', '42', {
    unitWords: 'µH/100',
    when: { calculation: WINDINGS, al: ['uH'] },
  }),
  millihenries: quantity('AL', '', '885', {
    unitWords: 'mH/1000',
    when: { calculation: WINDINGS, al: ['mH'] },
  }),
  series: choice(
    'Capacitors from',
    [
      { value: 'E12', label: 'E12' },
      { value: 'E24', label: 'E24' },
      { value: 'E96', label: 'E96' },
    ],
    'E24',
    { when: { calculation: ['l-network'] } },
  ),
  inductorQ: optional('Coil Q', '', { when: { calculation: ['l-network'] } }),
  capacitorQ: optional('Capacitor Q', '', { when: { calculation: ['l-network'] } }),
  diameterMetres: quantity('Diameter, to mid wire', 'mm', '10', { when: { calculation: ['air'] } }),
  lengthMetres: quantity('Length of the coil', 'mm', '15', { when: { calculation: ['air'] } }),
  turns: quantity('Turns', '', '12', {
    unitWords: 'turns',
    when: { calculation: ['air'], findOfCoil: ['henries'] },
  }),
  qFrom: choice(
    'Q of the coil, told by',
    [
      { value: 'q', label: 'Q' },
      { value: 'ohms', label: 'Resistance' },
    ],
    'q',
    { when: { calculation: ['resonance'] } },
  ),
  unloadedQ: quantity('Q, unloaded', '', '180', { when: { calculation: ['resonance'], qFrom: ['q'] } }),
  seriesOhms: quantity('Resistance in series', 'ohm', '0.35', {
    when: { calculation: ['resonance'], qFrom: ['ohms'] },
  }),
  bandwidthHertz: quantity('Bandwidth, −3 dB', 'kHz', '500', { when: { calculation: ['resonance'] } }),
  wireMetres: quantity('Wire, bare diameter', 'mm', '0.5', { when: { calculation: ['skin'] } }),
  voltsRms: quantity('Volts rms across it', 'V', '15.8', { when: { calculation: ['flux'] } }),
  fluxTurns: quantity('Turns', '', '12', { unitWords: 'turns', when: { calculation: ['flux'] } }),
  areaSquareMillimetres: quantity('Core cross section', '', '11.4', {
    unitWords: 'mm²',
    when: { calculation: ['flux'] },
  }),
  permittedMillitesla: optional('Flux permitted', '', { unitWords: 'mT', when: { calculation: ['flux'] } }),
};

export type MatchingInputs = BenchValues<typeof INPUTS>;
