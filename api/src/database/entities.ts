import { Session } from '../auth/session.entity';
import { SignInFailure } from '../auth/sign-in-failure.entity';
import { Build } from '../builds/build.entity';
import { BuildStage } from '../builds/build-stage.entity';
import { BuildStageEvent } from '../builds/build-stage-event.entity';
import { CheckMark } from '../builds/check-mark.entity';
import { Photo } from '../builds/photo.entity';
import { Reading } from '../builds/reading.entity';
import { Booking } from '../bookings/booking.entity';
import { BookingItem } from '../bookings/booking-item.entity';
import { Club } from '../club/club.entity';
import { BuildGroup, BuildGroupMember } from '../groups/build-group.entity';
import { Clearance } from '../instruments/clearance.entity';
import { Instrument } from '../instruments/instrument.entity';
import { InstrumentChange } from '../instruments/instrument-change.entity';
import { InstrumentKind } from '../instruments/instrument-kind.entity';
import { Resource } from '../instruments/resource.entity';
import { Mail } from '../mail/mail.entity';
import { Person } from '../people/person.entity';
import { LevelPoint } from '../plans/level-point.entity';
import { Plan } from '../plans/plan.entity';
import { PlanCheck } from '../plans/plan-check.entity';
import { PlanEdition } from '../plans/plan-edition.entity';
import { Stage } from '../plans/stage.entity';

/** Every table that has a class. */
export const entities = [
  Booking,
  BookingItem,
  Build,
  BuildGroup,
  BuildGroupMember,
  BuildStage,
  BuildStageEvent,
  CheckMark,
  Clearance,
  Club,
  Instrument,
  InstrumentChange,
  InstrumentKind,
  LevelPoint,
  Mail,
  Person,
  Photo,
  Plan,
  PlanCheck,
  PlanEdition,
  Reading,
  Resource,
  Session,
  SignInFailure,
  Stage,
];
