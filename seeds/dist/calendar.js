"use strict";
Object.defineProperty(exports, "__esModule", { value: true });
exports.calendarAround = calendarAround;
const temporal_polyfill_1 = require("temporal-polyfill");
const THURSDAY = 4;
const NIGHT_ENDS_AT = 22;
function isHoliday({ month, day }) {
    return (month === 12 && day >= 23) || (month === 1 && day === 1);
}
function calendarAround(now, timeZone) {
    const wall = temporal_polyfill_1.Temporal.Instant.fromEpochMilliseconds(now.getTime()).toZonedDateTimeISO(timeZone);
    const today = wall.toPlainDate();
    const isOver = today.dayOfWeek === THURSDAY && wall.hour >= NIGHT_ENDS_AT;
    const ahead = isOver ? 7 : (THURSDAY - today.dayOfWeek + 7) % 7;
    let nextNight = today.add({ days: ahead });
    while (isHoliday(nextNight))
        nextNight = nextNight.add({ days: 7 });
    const at = (day, hour, minute = 0) => new Date(day.toZonedDateTime({ timeZone, plainTime: { hour, minute } }).epochMilliseconds);
    return { now, today, nextNight, isHoliday, at };
}
//# sourceMappingURL=calendar.js.map