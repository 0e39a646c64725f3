const written = /^[A-Z]{2}\d{2}[A-Z0-9]{11,30}$/;

/** Whether an account number without spaces is an IBAN whose check digits fit (ISO 13616; ISO 7064, MOD 97-10). */
export function isIban(text: string): boolean {
  if (!written.test(text)) return false;
  const turned = text.slice(4) + text.slice(0, 4);
  let rest = 0;
  for (const sign of turned) {
    const digits = /\d/.test(sign) ? sign : String(sign.charCodeAt(0) - 55);
    for (const digit of digits) rest = (rest * 10 + Number(digit)) % 97;
  }
  return rest === 1;
}
