/*
 * Short zone names people write on papers. Browsers and servers carry different name tables ("GST" here, "GMT+4" there),
 * so ours are listed: the same page must read the same on both. Zones not listed are called by their offset.
 */
const ZONES: readonly { standard: string; summer?: string; standardMin: number; zones: readonly string[] }[] =
  [
    {
      standard: 'GMT',
      summer: 'BST',
      standardMin: 0,
      zones: ['Europe/London', 'Europe/Belfast', 'Europe/Jersey', 'Europe/Guernsey', 'Europe/Isle_of_Man'],
    },
    { standard: 'GMT', summer: 'IST', standardMin: 0, zones: ['Europe/Dublin'] },
    {
      standard: 'GMT',
      standardMin: 0,
      zones: ['Atlantic/Reykjavik', 'Africa/Accra', 'Africa/Abidjan', 'Africa/Dakar'],
    },
    {
      standard: 'WET',
      summer: 'WEST',
      standardMin: 0,
      zones: ['Europe/Lisbon', 'Atlantic/Canary', 'Atlantic/Madeira', 'Atlantic/Faroe'],
    },
    {
      standard: 'CET',
      summer: 'CEST',
      standardMin: 60,
      zones: [
        'Europe/Amsterdam',
        'Europe/Andorra',
        'Europe/Belgrade',
        'Europe/Berlin',
        'Europe/Bratislava',
        'Europe/Brussels',
        'Europe/Budapest',
        'Europe/Copenhagen',
        'Europe/Gibraltar',
        'Europe/Ljubljana',
        'Europe/Luxembourg',
        'Europe/Madrid',
        'Europe/Malta',
        'Europe/Monaco',
        'Europe/Oslo',
        'Europe/Paris',
        'Europe/Podgorica',
        'Europe/Prague',
        'Europe/Rome',
        'Europe/San_Marino',
        'Europe/Sarajevo',
        'Europe/Skopje',
        'Europe/Stockholm',
        'Europe/Tirane',
        'Europe/Vaduz',
        'Europe/Vienna',
        'Europe/Warsaw',
        'Europe/Zagreb',
        'Europe/Zurich',
        'Arctic/Longyearbyen',
        'Africa/Ceuta',
      ],
    },
    { standard: 'CET', standardMin: 60, zones: ['Africa/Algiers', 'Africa/Tunis'] },
    {
      standard: 'EET',
      summer: 'EEST',
      standardMin: 120,
      zones: [
        'Europe/Athens',
        'Europe/Bucharest',
        'Europe/Helsinki',
        'Europe/Kyiv',
        'Europe/Kiev',
        'Europe/Mariehamn',
        'Europe/Riga',
        'Europe/Sofia',
        'Europe/Tallinn',
        'Europe/Vilnius',
        'Asia/Nicosia',
        'Asia/Beirut',
        'Africa/Cairo',
      ],
    },
    { standard: 'SAST', standardMin: 120, zones: ['Africa/Johannesburg'] },
    {
      standard: 'CAT',
      standardMin: 120,
      zones: ['Africa/Harare', 'Africa/Lusaka', 'Africa/Maputo', 'Africa/Gaborone'],
    },
    {
      standard: 'EAT',
      standardMin: 180,
      zones: ['Africa/Nairobi', 'Africa/Addis_Ababa', 'Africa/Kampala', 'Africa/Dar_es_Salaam'],
    },
    { standard: 'MSK', standardMin: 180, zones: ['Europe/Moscow'] },
    { standard: 'TRT', standardMin: 180, zones: ['Europe/Istanbul'] },
    { standard: 'GST', standardMin: 240, zones: ['Asia/Dubai', 'Asia/Muscat'] },
    { standard: 'PKT', standardMin: 300, zones: ['Asia/Karachi'] },
    { standard: 'IST', standardMin: 330, zones: ['Asia/Kolkata', 'Asia/Calcutta'] },
    {
      standard: 'ICT',
      standardMin: 420,
      zones: ['Asia/Bangkok', 'Asia/Ho_Chi_Minh', 'Asia/Phnom_Penh', 'Asia/Vientiane'],
    },
    { standard: 'WIB', standardMin: 420, zones: ['Asia/Jakarta'] },
    { standard: 'SGT', standardMin: 480, zones: ['Asia/Singapore'] },
    { standard: 'MYT', standardMin: 480, zones: ['Asia/Kuala_Lumpur'] },
    { standard: 'HKT', standardMin: 480, zones: ['Asia/Hong_Kong'] },
    { standard: 'PHT', standardMin: 480, zones: ['Asia/Manila'] },
    { standard: 'AWST', standardMin: 480, zones: ['Australia/Perth'] },
    { standard: 'JST', standardMin: 540, zones: ['Asia/Tokyo'] },
    { standard: 'KST', standardMin: 540, zones: ['Asia/Seoul'] },
    { standard: 'ACST', standardMin: 570, zones: ['Australia/Darwin'] },
    { standard: 'ACST', summer: 'ACDT', standardMin: 570, zones: ['Australia/Adelaide'] },
    { standard: 'AEST', standardMin: 600, zones: ['Australia/Brisbane'] },
    {
      standard: 'AEST',
      summer: 'AEDT',
      standardMin: 600,
      zones: ['Australia/Sydney', 'Australia/Melbourne', 'Australia/Hobart'],
    },
    { standard: 'NZST', summer: 'NZDT', standardMin: 720, zones: ['Pacific/Auckland'] },
    { standard: 'HST', standardMin: -600, zones: ['Pacific/Honolulu'] },
    { standard: 'AKST', summer: 'AKDT', standardMin: -540, zones: ['America/Anchorage'] },
    {
      standard: 'PST',
      summer: 'PDT',
      standardMin: -480,
      zones: ['America/Los_Angeles', 'America/Vancouver', 'America/Tijuana'],
    },
    {
      standard: 'MST',
      summer: 'MDT',
      standardMin: -420,
      zones: ['America/Denver', 'America/Edmonton', 'America/Boise'],
    },
    { standard: 'MST', standardMin: -420, zones: ['America/Phoenix'] },
    { standard: 'CST', summer: 'CDT', standardMin: -360, zones: ['America/Chicago', 'America/Winnipeg'] },
    {
      standard: 'CST',
      standardMin: -360,
      zones: ['America/Mexico_City', 'America/Regina', 'America/Costa_Rica'],
    },
    {
      standard: 'EST',
      summer: 'EDT',
      standardMin: -300,
      zones: ['America/New_York', 'America/Toronto', 'America/Detroit'],
    },
    { standard: 'EST', standardMin: -300, zones: ['America/Panama', 'America/Jamaica'] },
    { standard: 'AST', summer: 'ADT', standardMin: -240, zones: ['America/Halifax'] },
    { standard: 'AST', standardMin: -240, zones: ['America/Puerto_Rico'] },
    { standard: 'NST', summer: 'NDT', standardMin: -210, zones: ['America/St_Johns'] },
    { standard: 'UTC', standardMin: 0, zones: ['UTC', 'Etc/UTC'] },
  ]

const BY_ZONE = new Map(ZONES.flatMap((row) => row.zones.map((zone) => [zone, row] as const)))

/** Every zone with a short name of its own. */
export const NAMED_ZONES: readonly string[] = [...BY_ZONE.keys()]

/** "GST", "BST"; null where people have no common short name, or the clock stands where the list does not expect it. */
export function shortZoneName(zone: string, offsetMin: number): string | null {
  const row = BY_ZONE.get(zone)
  if (row?.standardMin === offsetMin) return row.standard
  if (row?.summer && offsetMin === row.standardMin + 60) return row.summer
  return null
}
