export { eventsCalendar, uidOf } from './events-calendar.js';
export { CalendarEntryError, writeCalendar } from './calendar-writer.js';
export type { CalendarEntry, CalendarPlace, CalendarSpan, CalendarWords } from './calendar-writer.js';
