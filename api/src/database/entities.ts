import { Session } from '../auth/session.entity';
import { SignInFailure } from '../auth/sign-in-failure.entity';
import { Booking } from '../bookings/booking.entity';
import { BookingItem } from '../bookings/booking-item.entity';
import { BuildNight } from '../build-nights/build-night.entity';
import { BuildNightBench } from '../build-nights/build-night-bench.entity';
import { BuildNightMentor } from '../build-nights/build-night-mentor.entity';
import { BuildNightPlace } from '../build-nights/build-night-place.entity';
import { BuildNightSeries } from '../build-nights/build-night-series.entity';
import { BuildNightStage } from '../build-nights/build-night-stage.entity';
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
  BuildGroup,
  BuildGroupMember,
  BuildNight,
  BuildNightBench,
  BuildNightMentor,
  BuildNightPlace,
  BuildNightSeries,
  BuildNightStage,
  Clearance,
  Club,
  Instrument,
  InstrumentChange,
  InstrumentKind,
  LevelPoint,
  Mail,
  Person,
  Plan,
  PlanCheck,
  PlanEdition,
  Resource,
  Session,
  SignInFailure,
  Stage,
];
