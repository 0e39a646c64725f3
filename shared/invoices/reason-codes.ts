/** Codes for what comes off (UNTDID 5189, BR-CL-19) and for what is put on (UNTDID 7161, BR-CL-20), as EN 16931 admits them. */
const off: ReadonlySet<string> = new Set('41 42 60 62 63 64 65 66 67 68 70 71 88 95 100 102 103 104 105'.split(' '));
const on: ReadonlySet<string> = new Set(
  [
    'AA AAA AAC AAD AAE AAF AAH AAI AAS AAT AAV AAY AAZ ABA ABB ABC ABD ABF ABK ABL ABN ABR ABS ABT ABU ACF ACG ACH ACI',
    'ACJ ACK ACL ACM ACS ADC ADE ADJ ADK ADL ADM ADN ADO ADP ADQ ADR ADT ADW ADY ADZ AEA AEB AEC AED AEF AEH AEI AEJ AEK',
    'AEL AEM AEN AEO AEP AES AET AEU AEV AEW AEX AEY AEZ AJ AU CA CAB CAD CAE CAF CAI CAJ CAK CAL CAM CAN CAO CAP CAQ CAR',
    'CAS CAT CAU CAV CAW CAX CAY CAZ CD CG CS CT DAB DAD DAC DAF DAG DAH DAI DAJ DAK DAL DAM DAN DAO DAP DAQ DL EG EP ER',
    'FAA FAB FAC FC FH FI GAA HAA HD HH IAA IAB ID IF IR IS KO L1 LA LAA LAB LF MAE MI ML NAA OA PA PAA PC PL PRV RAB RAC',
    'RAD RAF RE RF RH RV SA SAA SAD SAE SAI SG SH SM SU TAB TAC TT TV V1 V2 WH XAA YY ZZZ',
  ].flatMap((row) => row.split(' ')),
);

/** Whether a code says why something comes off or is put on. */
export const isReasonCode = (code: string, charge: boolean): boolean => (charge ? on : off).has(code);
