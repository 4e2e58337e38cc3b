"use strict";
Object.defineProperty(exports, "__esModule", { value: true });
exports.stateOfClub = stateOfClub;
exports.wipe = wipe;
const club_1 = require("./club");
/** The club's own address is written last, so demo people without it are a seeding that was cut short. */
async function stateOfClub({ database }) {
    const [found] = await database.query(`SELECT count(*)::int AS people, (count(*) FILTER (WHERE email NOT LIKE '%@larkmoor.example'))::int AS strangers,
            (SELECT contact_email FROM club) AS contact
     FROM person`);
    if (!found || found.people === 0)
        return 'empty';
    return found.strangers === 0 && found.contact !== club_1.CLUB.contactEmail ? 'half seeded' : 'inhabited';
}
/**
 * Throws away a seeding that was cut short and lays the schema anew: the ledger's own rules let nobody empty it, and that
 * is right. Only ever called on a database without a stranger in it.
 */
async function wipe({ database }) {
    await database.query('DROP SCHEMA public CASCADE');
    await database.query('CREATE SCHEMA public');
    await database.runMigrations({ transaction: 'each' });
}
//# sourceMappingURL=state.js.map