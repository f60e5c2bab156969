import { roundUp } from '../quantities';

/** Evaluates what a formula shows, so that a test can compare it with what is run. */

const FUNCTIONS: Record<string, (...args: number[]) => number> = {
  exp: Math.exp,
  ln: Math.log,
  sqrt: Math.sqrt,
  min: Math.min,
  max: Math.max,
  round: (value) => Math.round(Math.round(value * 1e6) / 1e6),
  ceil: (value) => roundUp(value, 1),
};

function tokens(text: string): string[] {
  const found = text.match(/\d+(?:\.\d+)?|[A-Za-zΔα-ω_][A-Za-z0-9_'Δα-ω]*|[-+*/^(),]/g) ?? [];
  if (found.join('') !== text.replace(/\s/g, '')) throw new Error(`cannot read ${text}`);
  return found;
}

export function evaluateExpression(expression: string, figures: Record<string, number>): number {
  const list = tokens(expression);
  let at = 0;
  const next = (): string => {
    const token = list[at++];
    if (token === undefined) throw new Error(`${expression} ends too early`);
    return token;
  };
  const take = (...wanted: string[]): string | null => (wanted.includes(list[at] ?? '') ? next() : null);
  const expect = (wanted: string): void => {
    if (take(wanted) === null) throw new Error(`${wanted} is missing in ${expression}`);
  };

  function atom(): number {
    const token = next();
    if (token === '(') {
      const value = sum();
      expect(')');
      return value;
    }
    if (token === '-') return -power();
    if (/^\d/.test(token)) return Number(token);
    const call = FUNCTIONS[token];
    if (call !== undefined && take('(') !== null) {
      const args = [sum()];
      while (take(',') !== null) args.push(sum());
      expect(')');
      return call(...args);
    }
    const value = figures[token];
    if (value === undefined) throw new Error(`${token} in ${expression} has no figure`);
    return value;
  }
  function power(): number {
    const base = atom();
    return take('^') === null ? base : base ** power();
  }
  function product(): number {
    let value = power();
    for (let sign = take('*', '/'); sign !== null; sign = take('*', '/')) {
      value = sign === '*' ? value * power() : value / power();
    }
    return value;
  }
  function sum(): number {
    let value = product();
    for (let sign = take('+', '-'); sign !== null; sign = take('+', '-')) {
      value = sign === '+' ? value + product() : value - product();
    }
    return value;
  }

  const value = sum();
  if (at !== list.length) throw new Error(`${expression} goes on after ${list[at - 1]}`);
  return value;
}
