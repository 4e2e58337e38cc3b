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
import { Build } from '../builds/build.entity';
import { BuildStage } from '../builds/build-stage.entity';
import { BuildStageEvent } from '../builds/build-stage-event.entity';
import { CheckMark } from '../builds/check-mark.entity';
import { Photo } from '../builds/photo.entity';
import { Reading } from '../builds/reading.entity';
import { Worksheet } from '../builds/worksheet.entity';
import { Club } from '../club/club.entity';
import { OpeningHours } from '../club/opening-hours.entity';
import { Checkout } from '../dues/checkout.entity';
import { Invoice } from '../dues/invoice.entity';
import { Payment } from '../dues/payment.entity';
import { PaymentAllocation } from '../dues/payment-allocation.entity';
import { PaymentEvent } from '../dues/payment-event.entity';
import { PersonTier, Tier } from '../dues/tier.entity';
import { BuildGroup, BuildGroupMember } from '../groups/build-group.entity';
import { Clearance } from '../instruments/clearance.entity';
import { Instrument } from '../instruments/instrument.entity';
import { InstrumentChange } from '../instruments/instrument-change.entity';
import { InstrumentKind } from '../instruments/instrument-kind.entity';
import { Resource } from '../instruments/resource.entity';
import { Account } from '../ledger/account.entity';
import { Entry } from '../ledger/entry.entity';
import { Posting } from '../ledger/posting.entity';
import { Mail } from '../mail/mail.entity';
import { Person } from '../people/person.entity';
import { LevelPoint } from '../plans/level-point.entity';
import { Plan } from '../plans/plan.entity';
import { PlanCheck } from '../plans/plan-check.entity';
import { PlanEdition } from '../plans/plan-edition.entity';
import { Stage } from '../plans/stage.entity';
import { BankStatement } from '../reconciliation/bank-statement.entity';
import { LineMatch } from '../reconciliation/line-match.entity';
import { StatementLine } from '../reconciliation/statement-line.entity';

/** Every table that has a class. */
export const entities = [
  Account,
  BankStatement,
  Booking,
  BookingItem,
  Build,
  BuildGroup,
  BuildGroupMember,
  BuildNight,
  BuildNightBench,
  BuildNightMentor,
  BuildNightPlace,
  BuildNightSeries,
  BuildNightStage,
  BuildStage,
  BuildStageEvent,
  CheckMark,
  Checkout,
  Clearance,
  Club,
  Entry,
  Instrument,
  InstrumentChange,
  InstrumentKind,
  Invoice,
  LevelPoint,
  LineMatch,
  Mail,
  OpeningHours,
  Payment,
  PaymentAllocation,
  PaymentEvent,
  Person,
  PersonTier,
  Photo,
  Plan,
  PlanCheck,
  PlanEdition,
  Posting,
  Reading,
  Resource,
  Session,
  SignInFailure,
  Stage,
  StatementLine,
  Tier,
  Worksheet,
];
