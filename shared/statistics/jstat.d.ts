/** The part of jstat this project calls. */
declare module 'jstat' {
  interface JStat {
    readonly studentt: {
      cdf(t: number, degreesOfFreedom: number): number;
      inv(p: number, degreesOfFreedom: number): number;
    };
    readonly normal: {
      cdf(x: number, mean: number, sd: number): number;
      inv(p: number, mean: number, sd: number): number;
    };
  }
  const jStat: JStat;
  export default jStat;
}
