/**
 * Seeded standard normal numbers, the same on every machine: the counter-based mixer of G. L. Steele, D. Lea,
 * C. H. Flood, *OOPSLA* 2014 (SplitMix) in its 32-bit form, through the polar method of Marsaglia.
 */
export function standardNormals(seed: number): { next(): number } {
  const uniform = uniforms(seed);
  return {
    next: () => {
      for (;;) {
        const u = 2 * uniform.next() - 1;
        const v = 2 * uniform.next() - 1;
        const s = u * u + v * v;
        if (s > 0 && s < 1) return u * Math.sqrt((-2 * Math.log(s)) / s);
      }
    },
  };
}

/** Seeded numbers uniform on [0, 1). */
export function uniforms(seed: number): { next(): number } {
  let state = seed >>> 0;
  return {
    next: () => {
      state = (state + 0x9e3779b9) >>> 0;
      let mixed = state;
      mixed = Math.imul(mixed ^ (mixed >>> 16), 0x21f0aaad);
      mixed = Math.imul(mixed ^ (mixed >>> 15), 0x735a2d97);
      return ((mixed ^ (mixed >>> 15)) >>> 0) / 4294967296;
    },
  };
}
