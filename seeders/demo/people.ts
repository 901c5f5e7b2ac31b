/* Everybody here is invented; telephone numbers and addresses are from ranges kept for fiction. */

/** The demo's one password, printed by the start command on a demo installation. */
export const DEMO_PASSWORD = 'lichen-and-zinc-7'

export const DEMO_SHIPPERS = [
  {
    accountNo: '0412',
    name: 'Strand-Ekdahl family',
    email: 'j.strand@example.org',
    telephone: '+44 7700 900562',
    address: '11 Quarry Loan, Balfron, Stirlingshire',
  },
  {
    accountNo: '0431',
    name: 'Ferrand-Ito Animal Moves',
    email: 'desk@ferrand-ito.example',
    telephone: '+44 7700 900633',
    address: '4 Weir Yard, Peebles',
  },
  {
    accountNo: '0457',
    name: 'Thornfield Hatchery',
    email: 'office@thornfield-hatchery.example',
    telephone: '+44 7700 900277',
    address: 'Thornfield Farm, Lauder, Berwickshire',
  },
] as const

export interface DemoPerson {
  key: string
  name: string
  email: string
  role: 'dispatcher' | 'vet' | 'driver' | 'shipper' | 'admin'
  telephone: string
  shipperAccount?: string
  registration?: { number: string; country: string }
}

export const DEMO_PEOPLE: readonly DemoPerson[] = [
  {
    key: 'dispatcher',
    name: 'Isla Quennell',
    email: 'isla@corran.example',
    role: 'dispatcher',
    telephone: '+44 7700 900614',
  },
  {
    key: 'second-dispatcher',
    name: 'Nnedi Adeyemi-Ross',
    email: 'nnedi@corran.example',
    role: 'dispatcher',
    telephone: '+44 7700 900615',
  },
  {
    key: 'vet',
    name: 'Dr Sunniva Halloway-Odu',
    email: 'sunniva@corran.example',
    role: 'vet',
    telephone: '+44 7700 900418',
    registration: { number: 'VR 40 817', country: 'GB' },
  },
  {
    key: 'driver',
    name: 'Colm Bellweather',
    email: 'colm@corran.example',
    role: 'driver',
    telephone: '+44 7700 900387',
  },
  {
    key: 'second-driver',
    name: 'Maren Tolvaag',
    email: 'maren@corran.example',
    role: 'driver',
    telephone: '+44 7700 900388',
  },
  {
    key: 'shipper',
    name: 'Jorun Strand-Ekdahl',
    email: 'jorun@example.org',
    role: 'shipper',
    telephone: '+44 7700 900562',
    shipperAccount: '0412',
  },
  {
    key: 'second-shipper',
    name: 'Matteo Ferrand-Ito',
    email: 'matteo@ferrand-ito.example',
    role: 'shipper',
    telephone: '+44 7700 900633',
    shipperAccount: '0431',
  },
  {
    key: 'admin',
    name: 'Alban Penhallow',
    email: 'alban@corran.example',
    role: 'admin',
    telephone: '+44 7700 900611',
  },
]
