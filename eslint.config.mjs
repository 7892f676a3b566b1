// Next's rules, plus who may import whom (DEVELOPERS.md, layout).
import nextVitals from 'eslint-config-next/core-web-vitals'
import nextTypescript from 'eslint-config-next/typescript'
import prettier from 'eslint-config-prettier/flat'

const pure = [
  'error',
  { selector: "NewExpression[callee.name='Date'][arguments.length=0]", message: 'Take `now` as an argument.' },
]
const zone = (target, from, message) => ({ target, from, message })

const config = [
  { ignores: ['.next*/**', '.data/**', 'node_modules/**', 'next-env.d.ts', 'test-results/**'] },
  ...nextVitals,
  ...nextTypescript,
  {
    rules: {
      '@typescript-eslint/consistent-type-imports': 'error',
      '@typescript-eslint/no-unused-vars': ['error', { argsIgnorePattern: '^_', varsIgnorePattern: '^_' }],
      'import/no-cycle': 'error',
      'import/no-restricted-paths': [
        'error',
        {
          zones: [
            { target: './lib/physics', from: './', except: ['lib/physics', 'node_modules'] },
            { target: './lib/advice', from: './', except: ['lib/advice', 'lib/physics', 'node_modules'] },
            zone('./lib/weather', './db', 'Adapters know no database.'),
            zone('./lib/messaging', './db', 'Transports know no database.'),
            {
              target: './lib/services',
              from: './lib/auth',
              except: ['./passwords.ts', './account-links.ts'],
              message: 'Services get a context, they do not read sessions.',
            },
            zone('./lib', './app', 'Libraries know no routes.'),
            zone('./lib', './components', 'Libraries know no screens.'),
            zone('./components', './db', 'Screens get their data from services.'),
            zone('./app', './db', 'Routes call services.'),
            zone('./app', './jobs', 'Routes promise work through services.'),
            zone('./app', './fakes', 'The product reaches fakes by URL.'),
            zone('./lib', './fakes', 'The product reaches fakes by URL.'),
            ...['./app', './components', './lib/services', './lib/http', './lib/auth'].map((target) =>
              zone(target, './lib/access/system.ts', 'Only jobs act as the system.'),
            ),
          ],
        },
      ],
    },
  },
  {
    files: ['components/**', 'db/**'],
    ignores: ['db/seeds/**'],
    rules: {
      '@typescript-eslint/no-restricted-imports': [
        'error',
        {
          patterns: [
            {
              group: ['@/lib/services/*'],
              allowTypeImports: true,
              message: 'Services stand above: routes and jobs call them. Their types may be named.',
            },
          ],
        },
      ],
    },
  },
  {
    files: ['lib/physics/**', 'lib/advice/**'],
    rules: {
      'no-restricted-syntax': [
        ...pure,
        {
          selector: "MemberExpression[object.name='Date'][property.name='now']",
          message: 'Take `now` as an argument.',
        },
        {
          selector: "MemberExpression[object.name='Math'][property.name='random']",
          message: 'Take a seed as an argument.',
        },
        { selector: "MemberExpression[object.name='process']", message: 'Take settings as arguments.' },
      ],
    },
  },
  prettier,
]

export default config
