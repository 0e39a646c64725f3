/** Countries as the lists of EN 16931 know them (BR-CL-14): ISO 3166-1, with XI for Northern Ireland and 1A for Kosovo. */
const known: ReadonlySet<string> = new Set(
  [
    '1A AD AE AF AG AI AL AM AO AQ AR AS AT AU AW AX AZ BA BB BD BE BF BG BH BI BJ BL BM BN BO BQ BR BS BT BV BW BY BZ',
    'CA CC CD CF CG CH CI CK CL CM CN CO CR CU CV CW CX CY CZ DE DJ DK DM DO DZ EC EE EG EH ER ES ET FI FJ FK FM FO FR',
    'GA GB GD GE GF GG GH GI GL GM GN GP GQ GR GS GT GU GW GY HK HM HN HR HT HU ID IE IL IM IN IO IQ IR IS IT JE JM JO',
    'JP KE KG KH KI KM KN KP KR KW KY KZ LA LB LC LI LK LR LS LT LU LV LY MA MC MD ME MF MG MH MK ML MM MN MO MP MQ MR',
    'MS MT MU MV MW MX MY MZ NA NC NE NF NG NI NL NO NP NR NU NZ OM PA PE PF PG PH PK PL PM PN PR PS PT PW PY QA RE RO',
    'RS RU RW SA SB SC SD SE SG SH SI SJ SK SL SM SN SO SR SS ST SV SX SY SZ TC TD TF TG TH TJ TK TL TM TN TO TR TT TV',
    'TW TZ UA UG UM US UY UZ VA VC VE VG VI VN VU WF WS XI YE YT ZA ZM ZW',
  ].flatMap((row) => row.split(' ')),
);

/** Codes that places go by elsewhere, and the country they are or belong to. */
const others: Readonly<Record<string, string>> = {
  ...{ XK: '1A', UK: 'GB', EL: 'GR', AC: 'SH', TA: 'SH', DG: 'IO', CP: 'FR', CQ: 'GG', EA: 'ES', IC: 'ES' },
};

/** A country as invoices sent as data write it; undefined for two letters that are none. */
export function exchangeCountry(code: string): string | undefined {
  const written = others[code] ?? code;
  return known.has(written) ? written : undefined;
}

/** Whether a text is the number of a VAT registration as invoices write it: the letters of its country before it (EN 16931, BR-CO-09), of Greece EL. */
export const isVatNumber = (text: string): boolean =>
  /^[A-Z]{2}[0-9A-Z+*.]{2,18}$/.test(text) && (text.startsWith('EL') || known.has(text.slice(0, 2)));
