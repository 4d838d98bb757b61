/** The part of jStat that the tests compare with; the package has no types of its own. */
declare module 'jstat' {
  export const normal: {
    cdf(x: number, mean: number, sd: number): number;
    inv(p: number, mean: number, sd: number): number;
    pdf(x: number, mean: number, sd: number): number;
  };
}
