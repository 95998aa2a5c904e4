/** A value with its exact derivatives by the parameters (forward-mode differentiation), for the test models' Jacobians. */
export class Dual {
  constructor(
    readonly value: number,
    readonly derivatives: readonly number[],
  ) {}

  plus(other: Dual | number): Dual {
    return combine(this, other, (a, b) => [a + b, 1, 1]);
  }

  minus(other: Dual | number): Dual {
    return combine(this, other, (a, b) => [a - b, 1, -1]);
  }

  times(other: Dual | number): Dual {
    return combine(this, other, (a, b) => [a * b, b, a]);
  }

  over(other: Dual | number): Dual {
    return combine(this, other, (a, b) => [a / b, 1 / b, -a / (b * b)]);
  }

  /** this^exponent, this > 0 */
  power(exponent: Dual | number): Dual {
    return combine(this, exponent, (a, b) => [a ** b, b * a ** (b - 1), a ** b * Math.log(a)]);
  }

  exp(): Dual {
    return this.chain(Math.exp(this.value), Math.exp(this.value));
  }

  sin(): Dual {
    return this.chain(Math.sin(this.value), Math.cos(this.value));
  }

  cos(): Dual {
    return this.chain(Math.cos(this.value), -Math.sin(this.value));
  }

  arctan(): Dual {
    return this.chain(Math.atan(this.value), 1 / (1 + this.value ** 2));
  }

  private chain(value: number, slope: number): Dual {
    return new Dual(
      value,
      this.derivatives.map((derivative) => slope * derivative),
    );
  }
}

/** The parameters as variables to differentiate by. */
export function variables(values: ArrayLike<number>): Dual[] {
  return Array.from(
    values,
    (value, k) =>
      new Dual(
        value,
        Array.from(values, (_, j) => (j === k ? 1 : 0)),
      ),
  );
}

function combine(a: Dual, other: Dual | number, rule: (a: number, b: number) => [number, number, number]): Dual {
  const [value, byA, byB] = rule(a.value, typeof other === 'number' ? other : other.value);
  if (typeof other === 'number')
    return new Dual(
      value,
      a.derivatives.map((d) => byA * d),
    );
  return new Dual(
    value,
    a.derivatives.map((d, k) => byA * d + byB * other.derivatives[k]!),
  );
}
