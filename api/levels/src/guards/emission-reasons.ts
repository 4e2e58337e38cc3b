import { applies } from './asked';
import type { Asked } from './asked';
import { contains, merged, outside, overlaps } from './spans';

/** Why an emission does not fit. */
export interface EmissionReason {
  kind: 'outside' | 'not this class' | 'not this emission' | 'too wide' | 'too much power';
  text: string;
  rule: string;
  /** How much of it lies outside, Hz. */
  outsideHertz?: number;
}

/** Why an emission does not fit the bands, classes, kinds and widths of a set; empty when it does. */
export function bandReasons(asked: Asked): EmissionReason[] {
  const { ruleSet, span, licenceClass } = asked;
  const rows = ruleSet.bands.filter((row) => applies(row, asked));
  const own = merged(rows.flatMap((row) => row.spans));
  if (own.some((band) => contains(band, span))) return emissionReasons(asked);
  const others = ruleSet.bands.filter((row) => applies({ ...row, classes: undefined }, asked));
  const everybody = merged(others.flatMap((row) => row.spans));
  const isElses = everybody.some((band) => contains(band, span));
  const beyond = outside(own, span);
  const rule = (isElses ? others : rows).find((row) => row.spans.some((band) => overlaps(band, span)))?.rule;
  return [
    {
      kind: isElses ? 'not this class' : 'outside',
      text: isElses
        ? `The ${licenceClass ?? ''} class does not reach all of it.`
        : beyond === undefined
          ? 'It lies in no band of this set.'
          : `${(beyond * 1000).toFixed(0)} Hz of it lie outside the band.`,
      rule: rule ?? ruleSet.source,
      outsideHertz: beyond === undefined ? undefined : Math.round(beyond * 1e6) / 1000,
    },
  ];
}

function emissionReasons(asked: Asked): EmissionReason[] {
  const { ruleSet, emission, span, licenceClass = '' } = asked;
  const limit = ruleSet.classLimits.find(
    (row) => row.classes.includes(licenceClass) && overlaps(row.span, span) && !row.only.includes(emission),
  );
  if (limit !== undefined) {
    const text = `The ${licenceClass} class may only send ${limit.only.join(' and ')} here.`;
    return [{ kind: 'not this emission', text, rule: limit.rule }];
  }
  return ruleSet.anywhere.includes(emission) ? [] : segmentReasons(asked);
}

function segmentReasons(asked: Asked): EmissionReason[] {
  const { ruleSet, emission, span } = asked;
  const rows = ruleSet.segments.filter(
    (row) => applies(row, asked) && (row.emissions === undefined || row.emissions.includes(emission)),
  );
  const width = Math.round((span[1] - span[0]) * 1e6) / 1000;
  const fitting = rows.filter(({ widestHertz = Infinity }) => width <= widestHertz);
  if (merged(fitting.map((row) => row.span)).some((segment) => contains(segment, span))) return [];
  const here = rows.filter((row) => overlaps(row.span, span));
  const isKind = merged(here.map((row) => row.span)).some((segment) => contains(segment, span));
  const narrow = here.find(({ widestHertz = Infinity }) => width > widestHertz);
  if (isKind && narrow !== undefined) return [tooWide(narrow.widestHertz ?? 0, width, narrow)];
  const beyond = outside(merged(here.map((row) => row.span)), span);
  const rule =
    here[0]?.rule ?? ruleSet.segments.find((row) => overlaps(row.span, span))?.rule ?? ruleSet.source;
  const outsideHertz = beyond === undefined ? undefined : Math.round(beyond * 1e6) / 1000;
  const part = outsideHertz === undefined ? '' : ` for ${outsideHertz} Hz of it`;
  return [{ kind: 'not this emission', text: `${emission} has no place here${part}.`, rule, outsideHertz }];
}

function tooWide(
  widest: number,
  width: number,
  { rule, use }: { rule: string; use?: string },
): EmissionReason {
  const what = use === undefined ? '' : ` (${use})`;
  const text =
    widest === 0
      ? `No ordinary emission belongs here${what}.`
      : `At most ${widest} Hz wide here${what}; it is ${width} Hz.`;
  return { kind: 'too wide', text, rule };
}
