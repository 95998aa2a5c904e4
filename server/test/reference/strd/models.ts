import { type Dual } from './dual.js';

/** A model of the suite: ŷ from the parameters b and the predictors x. */
export interface StrdModel {
  /** Indices, from 0, of the parameters the model is linear in while the others are held */
  readonly linear: readonly number[];
  predict(b: readonly Dual[], x: readonly number[]): Dual;
  /** What is fitted in the place of y, where the suite says so */
  readonly transform?: (y: number) => number;
}

type Predict = StrdModel['predict'];

const exponentials: Predict = ([b1, b2, b3, b4, b5, b6], [x]) =>
  decay(b1!, b2!, x!)
    .plus(decay(b3!, b4!, x!))
    .plus(decay(b5!, b6!, x!));

const gaussians: Predict = ([b1, b2, b3, b4, b5, b6, b7, b8], [x]) =>
  decay(b1!, b2!, x!)
    .plus(bell(b3!, b4!, b5!, x!))
    .plus(bell(b6!, b7!, b8!, x!));

const ultrasonic: Predict = ([b1, b2, b3], [x]) => decay1(b1!, x!).over(b3!.times(x!).plus(b2!));

const cubicOverCubic: Predict = ([b1, b2, b3, b4, b5, b6, b7], [x]) =>
  polynomial([b1!, b2!, b3!, b4!], x!).over(polynomial([b5!, b6!, b7!], x!).times(x!).plus(1));

const saturation: Predict = ([b1, b2], [x]) => b1!.times(decay1(b2!, x!).times(-1).plus(1));

/** The 27 nonlinear-regression models of the NIST StRD, as each file states its own. */
export const strdModels: Readonly<Record<string, StrdModel>> = {
  Bennett5: { linear: [0], predict: ([b1, b2, b3], [x]) => b1!.times(b2!.plus(x!).power(b3!.power(-1).times(-1))) },
  BoxBOD: { linear: [0], predict: saturation },
  Chwirut1: { linear: [], predict: ultrasonic },
  Chwirut2: { linear: [], predict: ultrasonic },
  DanWood: { linear: [0], predict: ([b1, b2], [x]) => b1!.times(b2!.times(Math.log(x!)).exp()) },
  ENSO: {
    linear: [0, 1, 2, 4, 5, 7, 8],
    predict: ([b1, b2, b3, b4, b5, b6, b7, b8, b9], [x]) => {
      const year = (2 * Math.PI * x!) / 12;
      const [first, second] = [b4!, b7!].map((period) => period.power(-1).times(2 * Math.PI * x!));
      return b1!
        .plus(b2!.times(Math.cos(year)))
        .plus(b3!.times(Math.sin(year)))
        .plus(b5!.times(first!.cos()))
        .plus(b6!.times(first!.sin()))
        .plus(b8!.times(second!.cos()))
        .plus(b9!.times(second!.sin()));
    },
  },
  Eckerle4: {
    linear: [0],
    predict: ([b1, b2, b3], [x]) => {
      const distance = b3!.minus(x!).over(b2!);
      return b1!.over(b2!).times(distance.times(distance).times(-0.5).exp());
    },
  },
  Gauss1: { linear: [0, 2, 5], predict: gaussians },
  Gauss2: { linear: [0, 2, 5], predict: gaussians },
  Gauss3: { linear: [0, 2, 5], predict: gaussians },
  Hahn1: { linear: [0, 1, 2, 3], predict: cubicOverCubic },
  Kirby2: {
    linear: [0, 1, 2],
    predict: ([b1, b2, b3, b4, b5], [x]) =>
      polynomial([b1!, b2!, b3!], x!).over(polynomial([b4!, b5!], x!).times(x!).plus(1)),
  },
  Lanczos1: { linear: [0, 2, 4], predict: exponentials },
  Lanczos2: { linear: [0, 2, 4], predict: exponentials },
  Lanczos3: { linear: [0, 2, 4], predict: exponentials },
  MGH09: {
    linear: [0],
    predict: ([b1, b2, b3, b4], [x]) =>
      b1!.times(b2!.times(x!).plus(x! * x!)).over(
        b3!
          .times(x!)
          .plus(b4!)
          .plus(x! * x!),
      ),
  },
  MGH10: { linear: [0], predict: ([b1, b2, b3], [x]) => b1!.times(b2!.over(b3!.plus(x!)).exp()) },
  MGH17: {
    linear: [0, 1, 2],
    predict: ([b1, b2, b3, b4, b5], [x]) => b1!.plus(decay(b2!, b4!, x!)).plus(decay(b3!, b5!, x!)),
  },
  Misra1a: { linear: [0], predict: saturation },
  Misra1b: {
    linear: [0],
    predict: ([b1, b2], [x]) =>
      b1!.times(
        b2!
          .times(x! / 2)
          .plus(1)
          .power(-2)
          .times(-1)
          .plus(1),
      ),
  },
  Misra1c: {
    linear: [0],
    predict: ([b1, b2], [x]) =>
      b1!.times(
        b2!
          .times(2 * x!)
          .plus(1)
          .power(-0.5)
          .times(-1)
          .plus(1),
      ),
  },
  Misra1d: {
    linear: [0],
    predict: ([b1, b2], [x]) => b1!.times(b2!.times(x!)).over(b2!.times(x!).plus(1)),
  },
  Nelson: {
    linear: [0, 1],
    transform: Math.log,
    predict: ([b1, b2, b3], [x1, x2]) => b1!.minus(b2!.times(x1!).times(decay1(b3!, x2!))),
  },
  Rat42: { linear: [0], predict: ([b1, b2, b3], [x]) => b1!.over(b2!.minus(b3!.times(x!)).exp().plus(1)) },
  Rat43: {
    linear: [0],
    predict: ([b1, b2, b3, b4], [x]) => b1!.over(b2!.minus(b3!.times(x!)).exp().plus(1).power(b4!.power(-1))),
  },
  Roszman1: {
    linear: [0, 1],
    predict: ([b1, b2, b3, b4], [x]) =>
      b1!.minus(b2!.times(x!)).minus(b3!.over(b4!.times(-1).plus(x!)).arctan().over(Math.PI)),
  },
  Thurber: { linear: [0, 1, 2, 3], predict: cubicOverCubic },
};

function decay1(rate: Dual, x: number): Dual {
  return rate.times(-x).exp();
}

function decay(amplitude: Dual, rate: Dual, x: number): Dual {
  return amplitude.times(decay1(rate, x));
}

function bell(height: Dual, centre: Dual, width: Dual, x: number): Dual {
  const distance = centre.minus(x).over(width);
  return height.times(distance.times(distance).times(-1).exp());
}

function polynomial(coefficients: readonly Dual[], x: number): Dual {
  return coefficients.reduceRight((sum, coefficient) => sum.times(x).plus(coefficient));
}
