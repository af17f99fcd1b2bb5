export { eventsCalendar, uidOf } from './events-calendar.js';
export type { CalendarTitle } from './events-calendar.js';
export { CalendarEntryError, writeCalendar } from './calendar-writer.js';
export type { CalendarEntry, CalendarPlace, CalendarWords } from './calendar-writer.js';
