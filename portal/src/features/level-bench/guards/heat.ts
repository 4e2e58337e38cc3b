import {
  classBHeat,
  heatChain,
  formatQuantity,
  HOT_TO_TOUCH_CELSIUS,
  sinkNeeded,
  supplyDropVolts,
  type HeatChain,
  type SinkNeeded,
} from '@ferrite-row/levels';
import { fixed } from '../../../lib/text';
import { atField } from '../inputs/at-field';
import type { GuardValues } from './inputs';
import type { Judged, JudgedFigure, JudgedTable } from './judged';

/** Temperatures and resistances from the junction to the air, for the drawing. */
export interface HeatPicture {
  places: { name: string; celsius: number }[];
  resistances: { name: string; kelvinPerWatt: number }[];
  greatestJunctionCelsius: number;
  watts: number;
}

const celsius = (value: number): string => `${fixed(value)} °C`;

const sinkText = ({ isPossible, sinkToAir }: SinkNeeded): string =>
  isPossible && sinkToAir !== undefined ? `${fixed(Math.floor(sinkToAir * 100) / 100, 2)}` : 'None';

function junctionFigure({ junctionCelsius, marginKelvin }: HeatChain): JudgedFigure {
  const isOver = marginKelvin < 0;
  return {
    name: 'Junction',
    ...{ figure: fixed(junctionCelsius), unit: '°C' },
    words: isOver
      ? `${fixed(-marginKelvin)} K over what it may reach`
      : `${fixed(marginKelvin)} K under what it may reach`,
    tone: isOver ? 'caution' : 'plain',
  };
}

function sinkFigure({ sinkCelsius }: HeatChain): JudgedFigure {
  const isHot = sinkCelsius > HOT_TO_TOUCH_CELSIUS;
  return {
    name: 'Heat sink',
    ...{ figure: fixed(sinkCelsius), unit: '°C' },
    words: isHot ? 'burns a hand that stays on it' : 'warm to hot',
    tone: isHot ? 'caution' : 'plain',
  };
}

function neededFigure(needed: SinkNeeded): JudgedFigure {
  return needed.isPossible
    ? {
        name: 'Poorest sink that would do',
        figure: sinkText(needed),
        unit: 'K/W',
        words: 'at most, as mounted',
      }
    : {
        name: 'Poorest sink that would do',
        figure: 'None',
        words: 'Too much is lost before the sink: less power, or two devices.',
        tone: 'caution',
      };
}

/** Of an ideal class-B stage: its worst, and while two tones test it. */
function classBTable({ heatOf, classPeakWatts }: GuardValues): JudgedTable[] {
  if (heatOf !== 'class-B') return [];
  const { worstSwing, worstWatts, twoToneEfficiency, twoToneWatts } = classBOf(classPeakWatts);
  return [
    {
      title: 'An ideal class-B stage',
      heads: ['Figure', 'Value'],
      rows: [
        { cells: ['Hottest', `${fixed(worstWatts)} W, at ${fixed(100 * worstSwing, 0)} % of its swing`] },
        { cells: ['Two equal tones at full peak', `${fixed(twoToneWatts)} W`] },
        { cells: ['Efficiency then', `${fixed(100 * twoToneEfficiency)} %`] },
        { cells: ['Left out', 'idle current and what is left across the devices'] },
      ],
    },
  ];
}

const classBOf = (peakWatts: number) => atField({ peakWatts: 'classPeakWatts' }, () => classBHeat(peakWatts));

/** What the supply's wires take, where a current was typed. */
function wireTable({
  supplyAmperes: amperes,
  wireMetres,
  wireSquareMillimetres,
}: GuardValues): JudgedTable[] {
  if (amperes === undefined) return [];
  const areaSquareMetres = wireSquareMillimetres * 1e-6;
  const volts = supplyDropVolts({ amperes, lengthMetres: wireMetres, areaSquareMetres });
  return [
    {
      title: 'The wires of its supply',
      heads: ['Figure', 'Value'],
      rows: [
        { cells: ['Lost there and back', formatQuantity(volts, 'V')] },
        { cells: ['Heat in them', formatQuantity(volts * amperes, 'W')] },
        // No figure on purpose: sizes come from the national rules for wiring.
        { cells: ['Fuse', 'at the supply’s end, never above what the wire stands; wiring rules decide'] },
      ],
    },
  ];
}

function pictureOf(values: GuardValues, chain: HeatChain): HeatPicture {
  return {
    places: [
      { name: 'Junction', celsius: chain.junctionCelsius },
      { name: 'Case', celsius: chain.caseCelsius },
      { name: 'Sink', celsius: chain.sinkCelsius },
      { name: 'Air', celsius: values.ambientCelsius },
    ],
    resistances: [
      { name: 'junction to case', kelvinPerWatt: values.junctionToCase },
      { name: 'case to sink', kelvinPerWatt: values.caseToSink },
      { name: 'sink to air', kelvinPerWatt: values.sinkToAir },
    ],
    greatestJunctionCelsius: values.greatestJunctionCelsius,
    watts: values.watts,
  };
}

/** A device on its heat sink. */
export function judgeHeat(typed: GuardValues): Judged & { heat: HeatPicture } {
  const isClassB = typed.heatOf === 'class-B';
  const values = isClassB ? { ...typed, watts: classBOf(typed.classPeakWatts).worstWatts } : typed;
  const chain = heatChain(values, values.sinkToAir);
  const needed = sinkNeeded(values);
  const heat = pictureOf(values, chain);
  const rises = heat.resistances.map(
    ({ kelvinPerWatt }) => `${fixed(kelvinPerWatt, 2)} K/W, ${fixed(kelvinPerWatt * values.watts)} K`,
  );
  return {
    figures: [junctionFigure(chain), sinkFigure(chain), neededFigure(needed)],
    tables: [
      {
        title: 'From the junction to the air',
        heads: ['Place', 'Temperature', 'To the next'],
        rows: heat.places.map((place, index) => ({
          cells: [place.name, celsius(place.celsius), rises[index] ?? ''],
        })),
      },
      {
        title: 'At the most',
        heads: ['Figure', 'Value'],
        rows: [
          { cells: ['Heat at which the junction reaches its limit', `${fixed(chain.greatestWatts)} W`] },
          { cells: ['Junction may reach', celsius(values.greatestJunctionCelsius)] },
        ],
      },
      ...classBTable(values),
      ...wireTable(values),
    ],
    source:
      'Thermal resistances in series, data-sheet practice; class B: textbook; copper at 20 °C. Over 55 °C a sink burns a hand: common practice.',
    caution: {
      kind: 'hot parts',
      words:
        'Steady state in still air, with paste and pressure as assumed. It stays hot for ten minutes after power is off.',
    },
    heat,
  };
}
