import type { Span } from '../bookings/bookings.service';
import { spanWords } from '../common/wall-clock';
import { listText, nightName } from './night-words.rules';

interface Named extends Span {
  title: string;
  number: number | null;
}

/** A letter without its receiver. */
export interface LetterText {
  subject: string;
  text: string;
}

export interface Hall {
  zone: string;
  /** Where it meets; may be empty. */
  address: string;
  /** The page of the build nights. */
  link: string;
}

const paragraphs = (...parts: string[]): string => parts.filter((part) => part !== '').join('\n\n');
const dateList = (nights: readonly Span[], zone: string): string =>
  nights.map((night) => `  ${spanWords(night, zone)}`).join('\n');

/** To the people whose build is on a stage in focus. */
export function scheduledLetter(nights: readonly Named[], stages: readonly string[], hall: Hall): LetterText {
  const title = nights[0]?.title ?? '';
  const focus = stages.length === 0 ? '' : `In focus: ${listText(stages)}. Your build is on one of them.`;
  return {
    subject:
      nights.length === 1 ? `New build night: ${title}` : `${nights.length} new build nights: ${title}`,
    text: paragraphs(
      `${title} is planned:`,
      dateList(nights, hall.zone),
      focus,
      hall.address,
      `Say that you are coming: ${hall.link}`,
    ),
  };
}

/** To a mentor whom another mentor put on duty. */
export function onDutyLetter(nights: readonly Named[], planner: string, hall: Hall): LetterText {
  return {
    subject: `You are on duty: ${nights[0]?.title ?? ''}`,
    text: paragraphs(`${planner} has put you on duty:`, dateList(nights, hall.zone), hall.link),
  };
}

/** To whoever moved up from the waiting list. */
export function movedUpLetter(night: Named, hall: Hall): LetterText {
  return {
    subject: `You have a place: ${nightName(night)}`,
    text: paragraphs(
      `A place came free, and you were next in line. You are coming to ${nightName(night)}: ${spanWords(night, hall.zone)}.`,
      hall.address,
      `If you cannot come after all, say so, and the next in line moves up: ${hall.link}`,
    ),
  };
}

export function cancelledLetter(night: Named, reason: string, hall: Hall): LetterText {
  return {
    subject: `Cancelled: ${nightName(night)}`,
    text: paragraphs(
      `${nightName(night)}, ${spanWords(night, hall.zone)}, does not take place.`,
      reason,
      `The other build nights: ${hall.link}`,
    ),
  };
}

/** To everybody who was coming or waiting when the times change. */
export function changedLetter(before: Named, after: Named, hall: Hall): LetterText {
  return {
    subject: `Other times: ${nightName(after)}`,
    text: paragraphs(
      `${nightName(after)} is now ${spanWords(after, hall.zone)}. It was ${spanWords(before, hall.zone)}.`,
      `Your place is kept. If the new times do not suit you, say so: ${hall.link}`,
    ),
  };
}
