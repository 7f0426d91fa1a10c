/**
 * A pocket calculator for the number lines of a working, written apart from the program's own readers: + − × / √ min max, powers as
 * superscripts or after ^, narrow spaces between groups of digits.
 */
export const calculate = (line: string): number => {
  const text = line.replaceAll('\u202f', '').replaceAll(' ', '');
  let at = 0;
  const peek = () => text[at] ?? '';
  const take = (sign: string): boolean => {
    if (!text.startsWith(sign, at)) return false;
    at += sign.length;
    return true;
  };
  const demand = (sign: string) => {
    if (!take(sign)) throw new Error(`${sign} expected at ${at} of ${line}`);
  };

  const sum = (): number => {
    let value = product();
    for (;;) {
      if (take('+')) value += product();
      else if (take('−')) value -= product();
      else return value;
    }
  };
  const product = (): number => {
    let value = signed();
    for (;;) {
      if (take('×')) value *= signed();
      else if (take('/')) value /= signed();
      else return value;
    }
  };
  const signed = (): number => (take('−') ? -signed() : raised());
  const raised = (): number => {
    let value = atom();
    const superscripts = '⁰¹²³⁴⁵⁶⁷⁸⁹';
    let digits = '';
    while (peek() && superscripts.includes(peek())) {
      digits += superscripts.indexOf(peek());
      at += 1;
    }
    if (digits) value **= Number(digits);
    if (take('^')) value **= number();
    return value;
  };
  const list = (): number[] => {
    const values = [sum()];
    while (take(';')) values.push(sum());
    demand(')');
    return values;
  };
  const atom = (): number => {
    if (take('√(')) return Math.sqrt(list()[0]!);
    if (take('√')) return Math.sqrt(number());
    if (take('min(')) return Math.min(...list());
    if (take('max(')) return Math.max(...list());
    if (take('(')) return list()[0]!;
    return number();
  };
  const number = (): number => {
    const digits = /^\d+(\.\d+)?/.exec(text.slice(at));
    if (!digits) throw new Error(`number expected at ${at} of ${line}`);
    at += digits[0].length;
    return Number(digits[0]);
  };

  const value = sum();
  if (at !== text.length) throw new Error(`rest not read at ${at} of ${line}`);
  return value;
};
