const fractionAt = (text: string, sign: string): number => {
  const at = text.lastIndexOf(sign);
  return at >= 0 && /^\d+$/.test(text.slice(at + sign.length)) ? at : -1;
};

const fractionOf = (text: string, sign: string): string => {
  const at = fractionAt(text, sign);
  return at < 0 ? '' : text.slice(at);
};

/** What has to stand unseen behind each figure of a column so that all decimal signs come under one another. */
export function ghostFractions(texts: readonly string[], sign: string): string[] {
  const longest = Math.max(0, ...texts.map((text) => fractionOf(text, sign).length));
  return texts.map((text) => {
    const own = fractionOf(text, sign);
    const whole = longest > 0 ? sign + '0'.repeat(longest - sign.length) : '';
    return whole.slice(own.length);
  });
}
