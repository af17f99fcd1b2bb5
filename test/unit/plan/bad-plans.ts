/** Bad plans, each with every line that `synodos check` says of it. The file is called `p.yaml`. */
export interface BadPlan {
  readonly what: string;
  readonly text: string;
  readonly lines: readonly string[];
}

const good = 'title: T\nspan: { from: 2027-01-01, to: 2028-01-01 }\n';
const withSite = (fields: string): string =>
  `${good}sites:\n  - id: hill\n    latitude: 48\n    longitude: 11\n${fields}`;

export const badPlans: readonly BadPlan[] = [
  { what: 'an empty file', text: '', lines: ['p.yaml: is empty: write at least title and span'] },
  {
    what: 'nothing but comments',
    text: '# a plan\n   # to be\n---\n',
    lines: ['p.yaml:3:4: is empty: write fields, each on its own line with its name and a colon'],
  },
  {
    what: 'a NUL character',
    text: `${good}# \0\n`,
    lines: ['p.yaml: holds a NUL character: a plan is a text file (UTF-8) in YAML'],
  },
  {
    what: 'a list instead of fields',
    text: '- title: T\n',
    lines: ['p.yaml:1:1: is a list: write fields, each on its own line with its name and a colon'],
  },
  {
    what: 'a lone word',
    text: 'Mars\n',
    lines: ['p.yaml:1:1: is a text ("Mars"): write fields, each on its own line with its name and a colon'],
  },
  {
    what: 'no span and no title',
    text: 'stamp: 2027-01-01\n',
    lines: [
      'p.yaml:1:1: span: is missing: write fields, each on its own line with its name and a colon',
      'p.yaml:1:1: title: is missing: write a text',
    ],
  },
  {
    what: 'a misspelt field',
    text: 'titel: T\nspan: { from: 2027-01-01, to: 2028-01-01 }\n',
    lines: [
      'p.yaml:1:1: "titel" is no field here. Did you mean title?',
      'p.yaml:1:1: title: is missing: write a text',
    ],
  },
  {
    what: 'a field that nobody could have meant',
    text: `${good}colour: red\n`,
    lines: [
      'p.yaml:3:1: "colour" is no field here. There are: title, span, home, stamp, sites, schoolHolidays, openingRules, forecast, residuals',
    ],
  },
  {
    what: 'a misspelt field of a site',
    text: withSite('    elevatoin: 500\n'),
    lines: ['p.yaml:7:5: sites[0]: "elevatoin" is no field here. Did you mean elevation?'],
  },
  {
    what: 'an empty title',
    text: "title: ''\nspan: { from: 2027-01-01, to: 2028-01-01 }\n",
    lines: ['p.yaml:1:8: title: is empty: write a text'],
  },
  {
    what: 'a number for a title',
    text: 'title: 2027\nspan: { from: 2027-01-01, to: 2028-01-01 }\n',
    lines: ['p.yaml:1:8: title: is a number (2027): write a text'],
  },
  {
    what: 'a title without a value',
    text: 'title:\nspan: { from: 2027-01-01, to: 2028-01-01 }\n',
    lines: ['p.yaml:1:7: title: is empty: write a text'],
  },
  {
    what: 'a title without an end',
    text: `title: ${'x'.repeat(201)}\nspan: { from: 2027-01-01, to: 2028-01-01 }\n`,
    lines: ['p.yaml:1:8: title: has 201 characters: write at most 200'],
  },
  {
    what: 'a year for a date',
    text: 'title: T\nspan: { from: 2027, to: 2028-01-01 }\n',
    lines: ['p.yaml:2:15: span.from: is a number (2027): write a date like 2027-01-31'],
  },
  {
    what: 'a day that the calendar does not have',
    text: 'title: T\nspan: { from: 2027-02-29, to: 2028-01-01 }\n',
    lines: [
      'p.yaml:2:15: span.from: "2027-02-29" is not a date of the calendar: write YYYY-MM-DD, or an instant with its offset like 2027-01-31T18:30Z',
    ],
  },
  {
    what: 'a time of day without its offset',
    text: 'title: T\nspan: { from: "2027-01-01T12:00", to: 2028-01-01 }\n',
    lines: [
      'p.yaml:2:15: span.from: "2027-01-01T12:00" is not a date of the calendar: write YYYY-MM-DD, or an instant with its offset like 2027-01-31T18:30Z',
    ],
  },
  {
    what: 'dates before and after what is proven',
    text: 'title: T\nspan: { from: 1599-12-31, to: 2600-01-02 }\n',
    lines: [
      'p.yaml:2:15: span.from: "1599-12-31" lies before 1600-01-01: the positions are proven against an independent ephemeris only from 1600-01-01 to 2600-01-01',
      'p.yaml:2:31: span.to: "2600-01-02" lies after 2600-01-01: the positions are proven against an independent ephemeris only from 1600-01-01 to 2600-01-01',
    ],
  },
  {
    what: 'a span that ends before it begins',
    text: 'title: T\nspan: { from: 2028-01-01, to: 2027-01-01 }\n',
    lines: [
      'p.yaml:2:31: span.to: "2027-01-01" is not after "2028-01-01": the end of a span is not in it, write a later one',
    ],
  },
  {
    what: 'a span that no one could read',
    text: 'title: T\nspan: { from: 2000-01-01, to: 2600-01-01 }\n',
    lines: [
      'p.yaml:2:31: span.to: the span is 600 years long: a plan covers at most 25; for more, ask `synodos events` for tables alone',
    ],
  },
  {
    what: 'an empty span',
    text: 'title: T\nspan: { from: 2028-01-01, to: 2028-01-01 }\n',
    lines: [
      'p.yaml:2:31: span.to: "2028-01-01" is not after "2028-01-01": the end of a span is not in it, write a later one',
    ],
  },
  {
    what: 'a span that ends before midnight comes to the home site (03:00 UTC there)',
    text: 'title: T\nspan: { from: 2027-01-01, to: 2027-01-01T02:00Z }\nsites: [{ id: a, latitude: -31, longitude: -70, zone: America/Santiago }]\n',
    lines: [
      'p.yaml:2:31: span.to: "2027-01-01T02:00Z" is not after "2027-01-01": the end of a span is not in it, write a later one',
    ],
  },
  {
    what: 'the same where home is the second site and its zone is looked up',
    text: 'title: T\nspan: { from: 2027-01-01, to: 2027-01-01T02:00Z }\nhome: b\nsites: [{ id: a, latitude: 48, longitude: 11 }, { id: b, latitude: -31.2, longitude: -70.6 }]\n',
    lines: [
      'p.yaml:2:31: span.to: "2027-01-01T02:00Z" is not after "2027-01-01": the end of a span is not in it, write a later one',
    ],
  },
  {
    what: 'a home whose zone cannot be told: its own faults alone',
    text: 'title: T\nspan: { from: 2027-01-01, to: 2027-01-01T02:00Z }\nsites: [{ id: a, latitude: 98, longitude: 11 }]\n',
    lines: ['p.yaml:3:28: sites[0].latitude: 98 is out of range: write at most 90'],
  },
  {
    what: 'a list, a group and nothing for the name of a field, beside another fault',
    text: `${good}? [a, b]\n: 1\n? { c: d }\n: 2\n: 3\ncolour: red\n`,
    lines: [
      'p.yaml:3:3: a list, a group or an alias stands where a name should: write a plain name before the colon',
      'p.yaml:5:3: a list, a group or an alias stands where a name should: write a plain name before the colon',
      'p.yaml:7:1: a field without a name stands here: write its name before the colon',
      'p.yaml:8:1: "colour" is no field here. There are: title, span, home, stamp, sites, schoolHolidays, openingRules, forecast, residuals',
    ],
  },
  {
    what: 'control characters in a title and in a name',
    text: 'title: "T\\e[31m"\nspan: { from: 2027-01-01, to: 2028-01-01 }\nsites: [{ id: a, name: "\\a", latitude: 48, longitude: 11 }]\n',
    lines: [
      'p.yaml:1:8: title: "T\uFFFD[31m" holds a control character: remove it',
      'p.yaml:3:24: sites[0].name: "\uFFFD" holds a control character: remove it',
    ],
  },
  {
    what: 'a backward span beside other faults (cross checks run all the same)',
    text: 'titel: T\nspan: { from: 2028-01-01, to: 2027-01-01 }\n',
    lines: [
      'p.yaml:1:1: "titel" is no field here. Did you mean title?',
      'p.yaml:1:1: title: is missing: write a text',
      'p.yaml:2:31: span.to: "2027-01-01" is not after "2028-01-01": the end of a span is not in it, write a later one',
    ],
  },
  {
    what: 'a latitude and a longitude out of range',
    text: `${good}sites: [{ id: a, latitude: 91, longitude: -180.5 }]\n`,
    lines: [
      'p.yaml:3:28: sites[0].latitude: 91 is out of range: write at most 90',
      'p.yaml:3:43: sites[0].longitude: -180.5 is out of range: write at least -180',
    ],
  },
  {
    what: 'a latitude in quotes and a longitude with a letter',
    text: `${good}sites: [{ id: a, latitude: '48', longitude: 11E }]\n`,
    lines: [
      'p.yaml:3:28: sites[0].latitude: is a text ("48"): write a number',
      'p.yaml:3:45: sites[0].longitude: is a text ("11E"): write a number',
    ],
  },
  {
    what: 'a latitude that is not a number and one without end',
    text: `${good}sites: [{ id: a, latitude: .nan, longitude: .inf }]\n`,
    lines: [
      'p.yaml:3:28: sites[0].latitude: is no plain number (NaN): write a number',
      'p.yaml:3:45: sites[0].longitude: is no plain number (Infinity): write a number',
    ],
  },
  {
    what: 'a site without a place',
    text: `${good}sites: [{ id: a }]\n`,
    lines: [
      'p.yaml:3:9: sites[0].latitude: is missing: write a number',
      'p.yaml:3:9: sites[0].longitude: is missing: write a number',
    ],
  },
  {
    what: 'ids that would lead out of a folder',
    text: `${good}sites: [{ id: ../etc, latitude: 1, longitude: 1 }]\n`,
    lines: [
      'p.yaml:3:15: sites[0].id: "../etc" does not name a site: use letters, digits and hyphens, like north-hill',
    ],
  },
  {
    what: 'one id twice',
    text: `${good}sites:\n  - { id: a, latitude: 1, longitude: 1 }\n  - { id: a, latitude: 2, longitude: 2 }\n`,
    lines: ['p.yaml:5:11: sites[1].id: "a" is the id of sites[0] already: give every site its own'],
  },
  {
    what: 'a home that is no site',
    text: `home: hil\n${withSite('')}`,
    lines: ['p.yaml:1:7: home: "hil" is the id of no site. Did you mean hill?'],
  },
  {
    what: 'a home without sites',
    text: `${good}home: hill\n`,
    lines: ['p.yaml:3:7: home: "hill" is the id of no site. The plan has no sites'],
  },
  {
    what: 'a misspelt zone',
    text: withSite('    zone: Europe/Viena\n'),
    lines: ['p.yaml:7:11: sites[0].zone: "Europe/Viena" is not a time zone. Did you mean Europe/Vienna?'],
  },
  {
    what: 'a zone that is none',
    text: withSite('    zone: GMT plus some\n'),
    lines: [
      'p.yaml:7:11: sites[0].zone: "GMT plus some" is not a time zone. Write an IANA name like Europe/Vienna',
    ],
  },
  {
    what: 'horizon points that are none',
    text: withSite('    horizon: [[10], [400, 5], [20, 95]]\n'),
    lines: [
      'p.yaml:7:15: sites[0].horizon[0]: has 1 entry: write two numbers, [azimuth, altitude]',
      'p.yaml:7:22: sites[0].horizon[1][0]: 400 is out of range: write at most 360',
      'p.yaml:7:36: sites[0].horizon[2][1]: 95 is out of range: write at most 90',
    ],
  },
  {
    what: 'clear shares of eleven months and in percent',
    text: withSite('    clearShareByMonth: [0, 0, 0, 0, 0, 0, 0, 0, 0, 0, 35]\n'),
    lines: [
      'p.yaml:7:24: sites[0].clearShareByMonth: has 11 entries: write exactly 12',
      'p.yaml:7:55: sites[0].clearShareByMonth[10]: 35 is out of range: write at most 1',
    ],
  },
  {
    what: 'misspelt kinds and bodies',
    text: `${good}forecast: { kinds: [oposition], bodies: [marz, moon] }\n`,
    lines: [
      'p.yaml:3:21: forecast.kinds[0]: "oposition" is not known. Did you mean opposition?',
      'p.yaml:3:42: forecast.bodies[0]: "marz" is not known. Did you mean mars?',
      'p.yaml:3:48: forecast.bodies[1]: "moon" is not known. There are: mercury, venus, earth, mars, jupiter, saturn, uranus, neptune, pluto',
    ],
  },
  {
    what: 'a reckoning that is none and an appulse as wide as the sky',
    text: `${good}forecast: { reckoning: right ascension, withinDeg: 90 }\n`,
    lines: [
      'p.yaml:3:24: forecast.reckoning: "right ascension" is not known. Did you mean right-ascension?',
      'p.yaml:3:52: forecast.withinDeg: 90 is out of range: write at most 20',
    ],
  },
  {
    what: 'an empty list of kinds',
    text: `${good}forecast: { kinds: [] }\n`,
    lines: [
      'p.yaml:3:20: forecast.kinds: is an empty list: write at least one entry, or leave the field out',
    ],
  },
  {
    what: 'a word for a list',
    text: `${good}forecast: { kinds: opposition }\n`,
    lines: ['p.yaml:3:20: forecast.kinds: is a text ("opposition"): write a list (one - a line, or [ , ])'],
  },
  {
    what: 'pairs that are none',
    text: `${good}residuals: { pairs: [[mars, mars], [sun, earth], [mars], [mars, moon]] }\n`,
    lines: [
      'p.yaml:3:22: residuals.pairs[0]: "mars" twice: a pair is two different bodies',
      'p.yaml:3:36: residuals.pairs[1]: sun and earth mirror one motion: pair one of them with another planet',
      'p.yaml:3:50: residuals.pairs[2]: has 1 entry: write two bodies, like [earth, mars]',
      'p.yaml:3:65: residuals.pairs[3][1]: "moon" is not known. There are: sun, mercury, venus, earth, mars, jupiter, saturn, uranus, neptune, pluto',
    ],
  },
  {
    what: 'holidays that end too soon',
    text: `${good}schoolHolidays: [{ from: 2027-08-01, to: 2027-07-01 }]\n`,
    lines: [
      'p.yaml:3:42: schoolHolidays[0].to: "2027-07-01" is before "2027-08-01": write the last day of the holidays',
    ],
  },
  {
    what: 'a weekday that is none',
    text: `${good}openingRules: { weekdays: [freitag, 6] }\n`,
    lines: [
      'p.yaml:3:28: openingRules.weekdays[0]: "freitag" is not known. There are: monday, tuesday, wednesday, thursday, friday, saturday, sunday',
      'p.yaml:3:37: openingRules.weekdays[1]: is a number (6): write one of monday, tuesday, wednesday, thursday, friday, saturday, sunday',
    ],
  },
  {
    what: 'one key twice',
    text: `${good}title: U\n`,
    lines: ['p.yaml:3:1: this key stands twice in the same place: keep one of them'],
  },
  {
    what: 'a tab for indentation',
    text: 'title: T\nspan:\n\tfrom: 2027-01-01\n  to: 2028-01-01\n',
    lines: ['p.yaml:3:1: a tab indents this line: YAML is indented with spaces only'],
  },
  {
    what: 'a quote that is not closed',
    text: 'title: "T\nspan: 1\n',
    lines: ['p.yaml:3:1: a quote or a bracket is opened and not closed: close it'],
  },
  {
    what: 'a colon in a text',
    text: 'title: Mars: the year\n',
    lines: [
      'p.yaml:1:8: a second key or a colon on this line: put text that holds a colon in quotes, and every key on its own line',
    ],
  },
  {
    what: 'two documents',
    text: `${good}---\n${good}`,
    lines: ['p.yaml:3:1: a second document begins here: a plan is one document, remove the line ---'],
  },
  {
    what: 'a tag',
    text: 'title: !secret T\nspan: { from: 2027-01-01, to: 2028-01-01 }\n',
    lines: ['p.yaml:1:8: a tag (!…) stands here: plans have plain values only, remove it'],
  },
  {
    what: 'an alias to nothing',
    text: 'title: *name\nspan: { from: 2027-01-01, to: 2028-01-01 }\n',
    lines: ['p.yaml:1:8: *name stands for nothing: write the value itself, or mark it with &name further up'],
  },
  {
    what: 'aliases of aliases',
    text: 'a: &a [x, x]\nb: &b [*a, *a]\nc: &c [*b, *b]\n',
    lines: ['p.yaml:3:8: *b stands for something that holds an alias itself: write the value itself'],
  },
  {
    what: 'an alias in what it stands for',
    text: 'a: &a [*a]\n',
    lines: ['p.yaml:1:8: *a stands for something that holds an alias itself: write the value itself'],
  },
  {
    what: 'more aliases than a plan needs',
    text: `a: &a 1\nb: [${Array.from({ length: 60 }, () => '*a').join(', ')}]\n`,
    lines: ['p.yaml:2:205: more than 50 aliases (*…): write the values themselves'],
  },
  {
    what: 'prototype keys',
    text: `${good}__proto__: { title: U }\nconstructor: 1\n`,
    lines: [
      'p.yaml:3:1: "__proto__" is no field here. There are: title, span, home, stamp, sites, schoolHolidays, openingRules, forecast, residuals',
      'p.yaml:4:1: "constructor" is no field here. There are: title, span, home, stamp, sites, schoolHolidays, openingRules, forecast, residuals',
    ],
  },
];
