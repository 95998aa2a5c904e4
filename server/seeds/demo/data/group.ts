import { type DemoInstrument, type DemoPerson } from './demo.types.js';

/** The invented group: nobody in it exists, and its people are named by what they may do. */
export const GROUP = 'Transport Data Group (invented)';

export const STATEMENT =
  'Demo: every laboratory, measurement and person here is invented. The constants of substances are real and carry their sources.';

export const PEOPLE: readonly DemoPerson[] = [
  { key: 'researcher', name: 'Demo researcher', email: 'researcher@demo.example', roles: ['RESEARCHER'] },
  { key: 'researcher2', name: 'Second demo researcher', email: 'researcher2@demo.example', roles: ['RESEARCHER'] },
  { key: 'modeller', name: 'Demo modeller', email: 'modeller@demo.example', roles: ['MODELLER'] },
  { key: 'editor', name: 'Demo editor', email: 'editor@demo.example', roles: ['EDITOR'] },
  { key: 'editor2', name: 'Second demo editor', email: 'editor2@demo.example', roles: ['EDITOR'] },
  { key: 'administrator', name: 'Demo administrator', email: 'administrator@demo.example', roles: ['ADMINISTRATOR'] },
];

export const INSTRUMENTS: readonly DemoInstrument[] = [
  {
    key: 'tube-bath',
    name: 'Bath with three glass tubes, bores 3 mm and 5 mm',
    method: 'evaporation tube (Arnold cell)',
    note: 'Level read through a telescope to 0.02 mm; sweep vented to the fume hood.',
  },
  {
    key: 'balance-tube',
    name: 'Tube hung from a balance',
    method: 'evaporation tube (Arnold cell)',
    note: 'Mass read to 0.1 mg; bore 5 mm.',
  },
  {
    key: 'two-bulb',
    name: 'Two glass bulbs with a capillary between them',
    method: 'two-bulb cell',
    note: 'Composition by thermal conductivity; 50 kPa to 200 kPa.',
  },
];
