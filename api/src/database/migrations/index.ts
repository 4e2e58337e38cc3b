export { PeopleClubMail1700000000001 } from './0001-people-club-mail';
