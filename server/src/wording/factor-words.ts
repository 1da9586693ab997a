/** A conversion factor as a person writes it: `1000`, `2*pi/60`, `0.3048`. */
export function factorWords(value: number): string {
  for (const [suffix, divisor] of [['', 1], ['2*pi', 2 * Math.PI], ['pi', Math.PI]] as const) {
    const plain = plainNumber(value / divisor);
    if (plain === undefined) continue;
    if (suffix === '') return plain;
    return plain === '1' ? suffix : plain.startsWith('1/') ? `${suffix}${plain.slice(1)}` : `${suffix}*${plain}`;
  }
  for (const [name, divisor] of [['1/(2*pi)', 1 / (2 * Math.PI)]] as const) {
    const plain = plainNumber(value / divisor);
    if (plain !== undefined) return plain === '1' ? name : `${plain}/(2*pi)`;
  }
  return String(Number(value.toPrecision(9)));
}

/** Short decimals, and reciprocals of short integers; undefined for anything longer. */
function plainNumber(value: number): string | undefined {
  const short = Number(value.toPrecision(8));
  if (Math.abs(short / value - 1) > 1e-12 && Math.abs(Number(value.toPrecision(12)) / value - 1) > 1e-12) return reciprocal(value);
  const text = String(Number(value.toPrecision(12)));
  return text.replace(/^-?0?\./, '').length <= 8 ? text : reciprocal(value);
}

function reciprocal(value: number): string | undefined {
  const inverse = Math.round(1 / value);
  return inverse > 1 && inverse < 1e7 && Math.abs(inverse * value - 1) < 1e-11 ? `1/${inverse}` : undefined;
}
