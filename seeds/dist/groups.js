"use strict";
Object.defineProperty(exports, "__esModule", { value: true });
exports.seedGroups = seedGroups;
const groups_service_1 = require("@ferrite-row/api/groups/groups.service");
const GROUPS = [
    {
        name: 'Thursday Twenty',
        about: 'Bench 3 and 4 on Thursdays',
        members: ['tamsin', 'marek', 'lena', 'bea', 'kofi'],
    },
    { name: 'Filter corner', about: 'Crystal filters, Saturday mornings', members: ['noor', 'jonty', 'priya'] },
    { name: 'First winter', about: 'New this autumn, Bench 6', members: ['tobias', 'rhoda', 'ansel', 'yusra'] },
];
async function seedGroups({ context, as }) {
    const groups = context.get(groups_service_1.GroupsService);
    for (const { name, about, members } of GROUPS) {
        await groups.form({ name, about, memberIds: members.map((key) => as(key).personId) });
    }
    return GROUPS.length;
}
//# sourceMappingURL=groups.js.map