import tseslint from 'typescript-eslint';

/**
 * The house, from the ground up. A room may import from itself and from the floors listed for it, never from a
 * higher one and never from another room's inside (only its index).
 */
const rooms = {
  math: [],
  bodies: [],
  time: ['math'],
  cycles: ['math', 'time', 'bodies'],
  ephemeris: ['math', 'time', 'bodies'],
  sky: ['math', 'time', 'bodies', 'ephemeris'],
  forecast: ['math', 'time', 'bodies', 'cycles', 'ephemeris', 'sky'],
  output: ['math', 'time', 'bodies', 'cycles', 'ephemeris', 'sky', 'forecast'],
  plan: ['math', 'time', 'bodies', 'cycles', 'ephemeris', 'sky', 'forecast', 'output'],
  cli: ['math', 'time', 'bodies', 'cycles', 'ephemeris', 'sky', 'forecast', 'output', 'plan'],
};
const pureRooms = ['math', 'bodies', 'time', 'cycles', 'ephemeris', 'sky', 'forecast', 'output'];

const boundaries = Object.entries(rooms).map(([room, below]) => {
  const forbidden = Object.keys(rooms).filter((other) => other !== room && !below.includes(other));
  return {
    files: [`src/${room}/**/*.{ts,tsx}`],
    rules: {
      'no-restricted-imports': [
        'error',
        {
          patterns: [
            ...(forbidden.length > 0
              ? [
                  {
                    group: forbidden.flatMap((other) => [`**/${other}/*`, `**/${other}`]),
                    message: `src/${room} stands below or beside that room.`,
                  },
                ]
              : []),
            {
              regex: `^(?:\\.\\./)+(?:${Object.keys(rooms).join('|')})/(?!(?:[a-z-]+/)?index\\.js$)`,
              message: 'Enter another room by its index.js, not by a file inside it.',
            },
            ...(pureRooms.includes(room)
              ? [{ regex: '^node:', message: 'Rooms below plan/ are pure: no Node API.' }]
              : []),
          ],
        },
      ],
    },
  };
});

export default tseslint.config(
  { ignores: ['dist/', 'out/', 'node_modules/'] },
  ...tseslint.configs.strictTypeChecked,
  ...tseslint.configs.stylisticTypeChecked,
  {
    languageOptions: { parserOptions: { projectService: { allowDefaultProject: ['*.js', '*.mjs'] } } },
    rules: {
      '@typescript-eslint/restrict-template-expressions': ['error', { allowNumber: true }],
      '@typescript-eslint/no-non-null-assertion': 'off',
      '@typescript-eslint/consistent-type-imports': 'error',
      '@typescript-eslint/switch-exhaustiveness-check': [
        'error',
        { considerDefaultExhaustiveForUnions: true },
      ],
    },
  },
  {
    files: pureRooms.map((room) => `src/${room}/**/*.{ts,tsx}`),
    rules: {
      'no-restricted-globals': [
        'error',
        'process',
        'Buffer',
        '__dirname',
        'performance',
        'window',
        'document',
      ],
      'no-restricted-properties': [
        'error',
        { object: 'Date', property: 'now', message: 'The core has no clock.' },
        { object: 'Math', property: 'random', message: 'The core has no randomness.' },
        { object: 'DateTime', property: 'now', message: 'The core has no clock.' },
        { object: 'DateTime', property: 'local', message: 'The core has no zone of its own.' },
      ],
      'no-restricted-syntax': [
        'error',
        {
          selector: "NewExpression[callee.name='Date'][arguments.length=0]",
          message: 'The core has no clock.',
        },
        {
          selector: 'CallExpression[callee.property.name=/^toLocale/]',
          message: 'The core has no locale.',
        },
      ],
    },
  },
  ...boundaries,
  { files: ['**/*.{js,mjs}'], ...tseslint.configs.disableTypeChecked },
);
