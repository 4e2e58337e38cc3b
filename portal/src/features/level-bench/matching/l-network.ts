import {
  fitLadder,
  formatQuantity,
  frequencyGrid,
  ladderResponse,
  lNetworkLoss,
  lNetworks,
  matchFromImpedance,
  type FittedElement,
  type LadderElement,
  type LNetwork,
} from '@ferrite-row/levels';
import { capital, fixed } from '../../../lib/text';
import type { MatchingInputs } from './inputs';
import { vswrText } from './match';
import type { Figure, Sheet } from '../results/sheet';
import { alOf } from './windings';

/** One L-network of parts that can be had, and what they give. */
export interface FittedNetwork {
  /** 'Low-pass, Q 1.73'. */
  name: string;
  elements: FittedElement[];
  /** At the frequency, with the nearest parts, dB. */
  returnLossDb: number;
  /** At the frequency, of parts with the Q that was given and mismatch together, dB; absent where no Q was. */
  lossDb?: number;
  /** Along the sheet's frequencies. */
  curve: Float64Array;
  /** Where 20 dB or more is kept around the frequency; absent where it is not reached there. */
  good?: { low: number; high: number };
}

export interface NetworkSheet extends Sheet {
  kind: 'l-network';
  hertz: Float64Array;
  atHertz: number;
  networks: FittedNetwork[];
  sourceOhms: number;
  loadText: string;
}

const POINTS = 201;
const GOOD_DB = 20;

/** A network that passes neither high nor low has two of a kind, and there are two of those: told by where ground is. */
function passText({ passes, elements }: LNetwork): string {
  if (passes !== 'neither') return `${passes}-pass`;
  const kind = elements[0]?.part === 'inductor' ? 'two coils' : 'two capacitors';
  return `${kind}, ground at the ${elements[0]?.place === 'shunt' ? 'source' : 'load'}`;
}

const valueText = ({ part, value }: Pick<LadderElement, 'part' | 'value'>): string =>
  formatQuantity(value, part === 'inductor' ? 'H' : 'F');

/** '13 turns, 710 nH' or '390 pF'. */
export const fitText = (element: FittedElement): string =>
  element.turns ? `${element.turns.turns} turns, ${valueText(element)}` : valueText(element);

export const exactText = ({ part, exactValue }: FittedElement): string =>
  valueText({ part, value: exactValue });

/** The load's reactance as the coil or capacitor that has it at the frequency. */
function loadElement(reactance: number, hertz: number): LadderElement[] {
  const omega = 2 * Math.PI * hertz;
  if (reactance === 0) return [];
  return reactance > 0
    ? [{ name: 'load', place: 'series', part: 'inductor', value: reactance / omega }]
    : [{ name: 'load', place: 'series', part: 'capacitor', value: -1 / (omega * reactance) }];
}

/** The stretch around the middle of the grid where the return loss is good. */
function goodAround(curve: Float64Array, hertz: Float64Array): FittedNetwork['good'] {
  const isGood = (index: number) => (curve[index] ?? 0) >= GOOD_DB;
  const middle = (POINTS - 1) / 2;
  if (!isGood(middle)) return undefined;
  let [low, high] = [middle, middle];
  while (isGood(low - 1)) low -= 1;
  while (isGood(high + 1)) high += 1;
  return { low: hertz[low] ?? 0, high: hertz[high] ?? 0 };
}

function fittedNetwork(network: LNetwork, values: MatchingInputs, hertz: Float64Array): FittedNetwork {
  const { sourceOhms, resistanceOhms, reactanceOhms, frequencyHertz, series } = values;
  const q = { inductorQ: values.inductorQ, capacitorQ: values.capacitorQ };
  const isLossy = Object.values(q).some((one) => one !== undefined);
  const match = { sourceOhms, load: { resistanceOhms, reactanceOhms }, frequencyHertz };
  const ends = { sourceOhms, loadOhms: resistanceOhms };
  const { elements } = fitLadder(
    { elements: network.elements, ...ends },
    { capacitors: { series }, inductors: { alNanohenry: alOf(values) } },
  );
  const whole = { elements: [...elements, ...loadElement(reactanceOhms, frequencyHertz)], ...ends };
  // The load's own reactance would be given the parts' Q, so its curve is that of parts without loss.
  const curve = ladderResponse(whole, hertz, reactanceOhms === 0 ? q : {}).returnLossDb;
  return {
    name: `${capital(passText(network))}, Q ${fixed(network.q, 2)}`,
    elements,
    returnLossDb: curve[(POINTS - 1) / 2] ?? 0,
    lossDb: isLossy ? lNetworkLoss({ elements }, match, q).lossDb : undefined,
    curve,
    good: goodAround(curve, hertz),
  };
}

export function goodText({ good }: FittedNetwork): string {
  if (!good) return 'under 20 dB';
  const [low, high] = [good.low, good.high].map((hertz) => fixed(hertz / 1e6, 1));
  return `20 dB or more from ${low} to ${high} MHz`;
}

/** 'loss 0.12 dB', or nothing where no Q was given. */
export const lossText = ({ lossDb }: FittedNetwork): string =>
  lossDb === undefined ? '' : `loss ${fixed(lossDb, 2)} dB`;

const lossNote = ({ inductorQ, capacitorQ }: MatchingInputs): string =>
  inductorQ === undefined && capacitorQ === undefined
    ? 'Parts without loss; give their Q for what they take.'
    : 'Loss of the nearest parts with the Q given, mismatch included.';

export const elementsText = ({ elements }: FittedNetwork): string =>
  elements
    .map(
      (element) =>
        `${element.name} ${fitText(element)} ${element.place === 'series' ? 'in series' : 'to ground'}`,
    )
    .join('; ');

/** Every L-network between a source and a load, of whole turns and preferred capacitors. */
export function workNetwork(values: MatchingInputs): NetworkSheet {
  const { sourceOhms, resistanceOhms, reactanceOhms, frequencyHertz } = values;
  const load = { resistanceOhms, reactanceOhms };
  const found = lNetworks({ sourceOhms, load, frequencyHertz });
  const hertz = frequencyGrid(frequencyHertz / 2, frequencyHertz * 1.5, POINTS);
  const networks = found.map((network) => fittedNetwork(network, values, hertz));
  const loadText = loadWords(resistanceOhms, reactanceOhms);
  const without = matchFromImpedance(load, sourceOhms);
  return {
    kind: 'l-network',
    title: `${formatQuantity(sourceOhms, 'ohm')} to ${loadText} at ${fixed(frequencyHertz / 1e6, 3)} MHz`,
    note: `${lossNote(values)} The load’s reactance is taken as one coil or capacitor in series with it.`,
    hertz,
    atHertz: frequencyHertz,
    networks,
    sourceOhms,
    loadText,
    cells: [
      ...networks.slice(0, 2).map((network) => ({
        name: network.name,
        figure: fixed(Math.min(network.returnLossDb, 99), 1),
        unit: 'dB return loss',
        words: [lossText(network), goodText(network)].filter(Boolean).join(', '),
      })),
      {
        name: 'Without it',
        figure: vswrText(without),
        unit: 'VSWR',
        words: `${fixed(without.returnLossDb ?? 99)} dB return loss`,
        share: 0.8,
      },
    ],
    figures: networks.flatMap((network): Figure[] => [
      {
        name: network.name,
        figure: `${elementsText(network)}; return loss ${fixed(network.returnLossDb)} dB, ${[lossText(network), goodText(network)].filter(Boolean).join(', ')}`,
      },
      {
        name: 'Exact',
        figure: network.elements.map((element) => `${element.name} ${exactText(element)}`).join(', '),
      },
    ]),
  };
}

function loadWords(resistance: number, reactance: number): string {
  const sign = reactance < 0 ? '− j' : '+ j';
  return reactance === 0
    ? formatQuantity(resistance, 'ohm')
    : `${Number(resistance.toPrecision(4))} ${sign} ${formatQuantity(Math.abs(reactance), 'ohm')}`;
}
