/** The package ships no types; this is the part the checks use. */
declare module 'jstat' {
  interface Distribution<Parameters extends number[]> {
    inv(probability: number, ...parameters: Parameters): number;
    cdf(x: number, ...parameters: Parameters): number;
    mean(...parameters: Parameters): number;
    variance(...parameters: Parameters): number;
  }
  const library: {
    jStat: {
      normal: Distribution<[mean: number, sd: number]>;
      lognormal: Distribution<[mean: number, sd: number]>;
      triangular: Distribution<[least: number, most: number, mode: number]>;
      quantiles(values: number[], probabilities: number[], alphap: number, betap: number): number[];
    };
  };
  export default library;
}
