"use strict";
Object.defineProperty(exports, "__esModule", { value: true });
exports.PEOPLE = void 0;
const member = (key, name, ...roles) => ({
    key,
    name,
    email: `${name.toLowerCase().replaceAll(/[^a-z]+/g, '.')}@larkmoor.example`,
    roles: ['member', ...roles],
});
/** The accounts whose address says what they are for; the rest are first.last@. */
const known = (address, person) => ({
    ...person,
    email: `${address}@larkmoor.example`,
});
/** Larkmoor Radio Builders. All of them are invented. */
exports.PEOPLE = [
    known('member', member('tamsin', 'Tamsin Ardley')),
    known('member2', member('lena', 'Lena Quist')),
    known('mentor', member('hollis', 'Hollis Brandreth', 'mentor')),
    known('organiser', member('greta', 'Greta Sorley', 'mentor', 'organiser')),
    known('steward', member('oona', 'Oona Reyes', 'steward')),
    known('treasurer', member('ines', 'Ines Calloway', 'treasurer')),
    member('marek', 'Marek Ostrow'),
    member('noor', 'Noor Ashby'),
    member('mairi', 'Mairi Lockhart'),
    member('jonty', 'Jonty Peverell'),
    member('bea', 'Bea Thistlewood'),
    member('tobias', 'Tobias Fenn'),
    member('kofi', 'Kofi Ampah'),
    member('priya', 'Priya Vane'),
    member('desmond', 'Desmond Hale'),
    member('wilf', 'Wilf Carrow'),
    member('rhoda', 'Rhoda Minns'),
    member('ansel', 'Ansel Wray'),
    member('sunniva', 'Sunniva Brack'),
    member('idris', 'Idris Pennow'),
    member('orla', 'Orla Tamblyn', 'mentor'),
    member('cosmo', 'Cosmo Farrant'),
    member('yusra', 'Yusra Haddow'),
    member('petra', 'Petra Vinter', 'steward'),
    member('gwil', 'Gwil Maddern'),
    member('thea', 'Thea Marchbank'),
    member('ruben', 'Ruben Salcott'),
    member('edda', 'Edda Thorley'),
];
//# sourceMappingURL=people.js.map