import type { StageEventKind } from './build-stage-event.entity';
import type { KeptStageState } from './build-stage.entity';

export const STAGE_STATES = [
  'not started',
  'on the bench',
  'with mentor',
  'sent back',
  'signed off',
  'locked',
] as const;
export type StageState = (typeof STAGE_STATES)[number];

/** One stage of a build as the stages after it see it. */
export interface Standing {
  position: number;
  name: string;
  state: KeptStageState;
  /** On the air: waits for a licence as well. */
  needsLicence: boolean;
}

const isPast = ({ state }: Standing): boolean => state === 'with mentor' || state === 'signed off';
const isSignedOff = ({ state }: Standing): boolean => state === 'signed off';
const called = ({ position, name }: Standing): string => `stage ${position} ${name}`;

/**
 * Why a stage cannot be begun, or null when it can.
 *
 * A stage opens when every stage before it is with a mentor or signed off: a member who has sent one off may go on while
 * it is looked at. A stage that needs a licence goes on the air, so it waits until every stage before it is signed off
 * and an organiser has seen the licence. What was begun stays open, also when an earlier stage is sent back.
 *
 * @param before - the stages before it.
 */
export function lockOf(stage: Standing, before: readonly Standing[], isLicenceSeen: boolean): string | null {
  if (stage.state !== 'not started') return null;
  return waitOf(stage, before, isLicenceSeen);
}

/** What a stage still waits for before it may be sent to a mentor; the same as opens it, or null. */
export function waitOf(stage: Standing, before: readonly Standing[], isLicenceSeen: boolean): string | null {
  if (stage.needsLicence) return airWaitOf(before, isLicenceSeen);
  const waits = before.find((other) => !isPast(other));
  return waits ? `It opens when ${called(waits)} is with a mentor or signed off.` : null;
}

/** The way on the air: everything it waits for at once, so that the licence is not news at the very end. */
function airWaitOf(before: readonly Standing[], isLicenceSeen: boolean): string | null {
  const open = before.filter((other) => !isSignedOff(other));
  const [first] = open;
  const stages =
    first && (open.length === 1 ? `${called(first)} is signed off` : `${spanOf(open)} are signed off`);
  const licence = isLicenceSeen ? undefined : 'an organiser has seen your licence';
  const waits = [stages, licence].filter((one) => one !== undefined);
  return waits.length === 0 ? null : `It opens when ${waits.join(' and ')}.`;
}

const spanOf = (stages: readonly Standing[]): string =>
  `stages ${stages[0]?.position} ${stages.length === 2 ? 'and' : 'to'} ${stages.at(-1)?.position}`;

/** What moved one of the stages before, and when. */
interface Moved {
  stageId: string;
  kind: StageEventKind;
  at: Date;
}

/**
 * When a stage opened: nothing on it can have been read before.
 *
 * @param before - the stages before it.
 * @param events - of the whole build, in the order of time.
 */
export function openedAt(
  { needsLicence }: Pick<Standing, 'needsLicence'>,
  before: readonly { stageId: string }[],
  events: readonly Moved[],
  { startedAt, licenceSeenAt }: { startedAt: Date; licenceSeenAt: Date | null },
): Date {
  const opener: StageEventKind = needsLicence ? 'signed off' : 'sent';
  const moves = before.map(({ stageId }) =>
    events.find((event) => event.stageId === stageId && event.kind === opener),
  );
  const instants = [startedAt, needsLicence ? licenceSeenAt : null, ...moves.map((move) => move?.at)];
  return new Date(Math.max(...instants.map((instant) => instant?.getTime() ?? 0)));
}

/** Why a stage cannot be signed off yet: those before it feed it, so they are signed off first. */
export function signOffWaitOf(before: readonly Standing[]): string | null {
  const waits = before.find((other) => !isSignedOff(other));
  return waits ? `Sign off ${called(waits)} first.` : null;
}

export function isInBuildersHands(state: KeptStageState): boolean {
  return state === 'not started' || state === 'on the bench' || state === 'sent back';
}

/** The stage a member is on: the first open one that is not settled, or else the last that was sent. */
export function currentOf<T extends { state: StageState }>(stages: readonly T[]): T | undefined {
  const open: readonly StageState[] = ['sent back', 'on the bench', 'not started'];
  return (
    stages.find(({ state }) => open.includes(state)) ??
    stages.findLast(({ state }) => state === 'with mentor') ??
    stages.at(-1)
  );
}
