import type { SpuriousRuleId } from './spurious-rules';

/** Kinds of emission the rules tell apart. */
export type EmissionKind = 'CW' | 'phone' | 'image' | 'RTTY' | 'data' | 'MCW' | 'test';

/** From and to, kHz, both included. */
export type Span = readonly [number, number];

/** Days on which a row holds, ISO 8601: from `since` on, and before `until`. Always where left out. */
export interface Dated {
  since?: string;
  until?: string;
}

/** Where a row comes from. */
export interface Ruled {
  /** Clause of the source. */
  rule: string;
}

/** Frequencies of a band, for some licence classes and regions of the world. */
export interface BandRow extends Dated, Ruled {
  band: string;
  spans: readonly Span[];
  /** All where left out. */
  classes?: readonly string[];
  /** Regions of the ITU, 1 to 3; all where left out. */
  regions?: readonly number[];
}

/** What may be sent in part of a band. */
export interface SegmentRow extends Dated, Ruled {
  span: Span;
  /** Every kind where left out. */
  emissions?: readonly EmissionKind[];
  /** Hz; 0 for beacons and the like, where no ordinary emission belongs. */
  widestHertz?: number;
  regions?: readonly number[];
  use?: string;
}

/** Less than the rest may send, for some licence classes. */
export interface ClassRow extends Ruled {
  classes: readonly string[];
  span: Span;
  only: readonly EmissionKind[];
}

/** Single frequencies outside the bands, each to be used in the middle. */
export interface ChannelRow extends Dated, Ruled {
  band: string;
  centresKilohertz: readonly number[];
  widestHertz: number;
  classes: readonly string[];
  emissions: readonly EmissionKind[];
  erpWatts: number;
}

/** The most power in part of the spectrum; the lowest that applies counts. */
export interface PowerRow extends Dated, Ruled {
  span: Span;
  classes?: readonly string[];
  regions?: readonly number[];
  peakWatts?: number;
  /** Against a half-wave dipole. */
  erpWatts?: number;
}

/** Something to know about part of a band. */
export interface NoteRow extends Ruled {
  span: Span;
  text: string;
}

/** Rules, or a plan, an organiser may choose for the club. */
export interface RuleSet {
  id: 'US-97' | 'IARU-R1';
  title: string;
  kind: 'law' | 'band plan';
  source: string;
  /** Day of the text it was read from. */
  textDate: string;
  /** Earliest day it may be asked about. */
  coversFrom: string;
  /** To be shown with every answer. */
  caution: string;
  /** Empty where the set knows none. */
  licenceClasses: readonly string[];
  regions: readonly number[];
  /** Emissions permitted wherever the class may transmit. */
  anywhere: readonly EmissionKind[];
  bands: readonly BandRow[];
  segments: readonly SegmentRow[];
  classLimits: readonly ClassRow[];
  channels: readonly ChannelRow[];
  power: readonly PowerRow[];
  notes: readonly NoteRow[];
  /** Limit of spurious emissions by the carrier's frequency. */
  spurious: { below30MHz: SpuriousRuleId; from30MHz: SpuriousRuleId };
}
