"use strict";
Object.defineProperty(exports, "__esModule", { value: true });
exports.CLUB = void 0;
exports.CLUB = {
    name: 'Larkmoor Radio Builders',
    address: 'Millbeck Hall, Larkmoor',
    contactEmail: 'desk@larkmoor.example',
    timeZone: 'Europe/London',
    currency: 'GBP',
    accountName: 'Larkmoor Radio Builders',
    accountNumber: '00-41-17 3006 4417',
};
//# sourceMappingURL=club.js.map