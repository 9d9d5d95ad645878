/**
 * Decimals of each currency's minor unit: ISO 4217, list one, published 2024-06-25 (SIX Financial
 * Information, maintenance agency). Codes without a minor unit (metals, testing, units of account)
 * are not currencies one can pay in and are left out.
 */
const CODES_BY_DECIMALS: Record<0 | 2 | 3 | 4, string> = {
  0: `
  BIF CLP DJF GNF ISK JPY KMF KRW PYG RWF UGX UYI VND VUV XAF XOF XPF`,
  2: `
  AED AFN ALL AMD ANG AOA ARS AUD AWG AZN BAM BBD BDT BGN BMD BND BOB BOV BRL BSD BTN BWP BYN BZD CAD
  CDF CHE CHF CHW CNY COP COU CRC CUC CUP CVE CZK DKK DOP DZD EGP ERN ETB EUR FJD FKP GBP GEL GHS GIP
  GMD GTQ GYD HKD HNL HTG HUF IDR ILS INR IRR JMD KES KGS KHR KPW KYD KZT LAK LBP LKR LRD LSL MAD MDL
  MGA MKD MMK MNT MOP MRU MUR MVR MWK MXN MXV MYR MZN NAD NGN NIO NOK NPR NZD PAB PEN PGK PHP PKR PLN
  QAR RON RSD RUB SAR SBD SCR SDG SEK SGD SHP SLE SOS SRD SSP STN SVC SYP SZL THB TJS TMT TOP TRY TTD
  TWD TZS UAH USD USN UYU UZS VED VES WST XCD YER ZAR ZMW ZWG`,
  3: `
  BHD IQD JOD KWD LYD OMR TND`,
  4: `
  CLF UYW`,
};

export const CURRENCY_DECIMALS: ReadonlyMap<string, number> = new Map(
  Object.entries(CODES_BY_DECIMALS).flatMap(([decimals, codes]) =>
    codes
      .trim()
      .split(/\s+/)
      .map((code) => [code, Number(decimals)] as const),
  ),
);

/** The list's date, for the page that names it. */
export const CURRENCY_LIST_DATE = "2024-06-25";

/**
 * Decimals of the minor unit; null for a code that is not on the list.
 *
 * @example currencyDecimals("KWD") === 3; currencyDecimals("XXX") === null
 */
export function currencyDecimals(code: string): number | null {
  return CURRENCY_DECIMALS.get(code) ?? null;
}
