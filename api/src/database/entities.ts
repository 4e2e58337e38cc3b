import { Session } from '../auth/session.entity';
import { SignInFailure } from '../auth/sign-in-failure.entity';
import { Club } from '../club/club.entity';
import { Mail } from '../mail/mail.entity';
import { Person } from '../people/person.entity';

/** Every table that has a class. */
export const entities = [Club, Mail, Person, Session, SignInFailure];
