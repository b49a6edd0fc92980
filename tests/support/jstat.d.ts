/** The general-purpose statistics library as far as tests ask it; it comes without types. */
declare module "jstat" {
  const library: {
    jStat: {
      chisquare: { cdf: (x: number, df: number) => number; inv: (p: number, df: number) => number };
      gamma: { cdf: (x: number, shape: number, scale: number) => number; inv: (p: number, shape: number, scale: number) => number };
      beta: { cdf: (x: number, a: number, b: number) => number; inv: (p: number, a: number, b: number) => number };
      normal: { cdf: (x: number, mean: number, sd: number) => number; inv: (p: number, mean: number, sd: number) => number };
      poisson: { pdf: (k: number, mean: number) => number };
      negbin: { pdf: (k: number, r: number, p: number) => number };
    };
  };
  export default library;
}
