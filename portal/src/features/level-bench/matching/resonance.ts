import {
  capacitiveReactance,
  coilQ,
  formatQuantity,
  inductiveReactance,
  loadedQ,
  resonantHertz,
  resonatingFarads,
  resonatingHenries,
  resonatorLossDb,
} from '@ferrite-row/levels';
import { fixed } from '../../../lib/text';
import { atField } from '../inputs/at-field';
import type { MatchingInputs } from './inputs';
import { cellOf, type Figure, type Sheet } from '../results/sheet';

interface Circuit {
  hertz: number;
  henries: number;
  farads: number;
}

export interface ResonanceSheet extends Sheet {
  kind: 'resonance';
  reactances: ReactanceRow[];
}

/** Sizes of both reactances at a frequency, ohms. */
export interface ReactanceRow {
  hertz: number;
  coil: number;
  capacitor: number;
}

const FIELDS = { henries: 'resonantHenries', frequencyHertz: 'centreHertz' };

function circuitOf({ find, centreHertz, resonantHenries, farads }: MatchingInputs): Circuit {
  if (find === 'frequency')
    return { hertz: resonantHertz(resonantHenries, farads), henries: resonantHenries, farads };
  return find === 'henries'
    ? { hertz: centreHertz, henries: resonatingHenries(centreHertz, farads), farads }
    : {
        hertz: centreHertz,
        henries: resonantHenries,
        farads: resonatingFarads(centreHertz, resonantHenries),
      };
}

const POINTS = 41;

/** From half the resonance to one and a half times it, the resonance itself in the middle. */
function reactancesOf({ hertz, henries, farads }: Circuit): ReactanceRow[] {
  return Array.from({ length: POINTS }, (_, step) => {
    const at = hertz * (0.5 + step / (POINTS - 1));
    return { hertz: at, coil: inductiveReactance(at, henries), capacitor: -capacitiveReactance(at, farads) };
  });
}

const quantity = (value: number, unit: 'Hz' | 'H' | 'F' | 'ohm') => formatQuantity(value, unit, 4);

/** Resonance of a coil and a capacitor, and what its Q makes of it. */
export function workResonance(values: MatchingInputs): ResonanceSheet {
  const circuit = atField(FIELDS, () => circuitOf(values));
  const { hertz, henries, farads } = circuit;
  const reactance = inductiveReactance(hertz, henries);
  const unloaded = values.qFrom === 'q' ? values.unloadedQ : coilQ(hertz, henries, values.seriesOhms);
  const loaded = loadedQ(hertz, values.bandwidthHertz);
  const lossDb = resonatorLossDb(loaded, unloaded);
  const found: Record<MatchingInputs['find'], Figure> = {
    frequency: { name: 'Resonance', figure: quantity(hertz, 'Hz') },
    henries: { name: 'Coil', figure: quantity(henries, 'H') },
    farads: { name: 'Capacitor', figure: quantity(farads, 'F') },
  };
  const each = { name: 'Reactance of each', figure: quantity(reactance, 'ohm') };
  const q = { name: 'Loaded Q', figure: loaded.toPrecision(3) };
  const loss = { name: 'Loss of one resonator', figure: `${fixed(lossDb, 2)} dB` };
  const others = Object.values(found).filter((figure) => figure !== found[values.find]);
  return {
    kind: 'resonance',
    title: 'A resonant circuit',
    reactances: reactancesOf(circuit),
    cells: [
      cellOf(found[values.find], others.map(({ figure }) => figure).join(', ')),
      cellOf(each),
      cellOf(q, `${quantity(values.bandwidthHertz, 'Hz')} wide at −3 dB`),
      cellOf(loss, 'coupled alike at both ends'),
    ],
    figures: [
      ...Object.values(found),
      each,
      { name: 'Q of the coil', figure: unloaded.toPrecision(3) },
      { name: 'Resistance in series with it', figure: quantity(reactance / unloaded, 'ohm') },
      q,
      loss,
    ],
  };
}
