/** The few functions of jstat that the cross-checks use; the package has no types of its own. */
declare module 'jstat' {
  const jstat: {
    studentt: { inv(p: number, dof: number): number };
    normal: {
      inv(p: number, mean: number, sd: number): number;
      cdf(x: number, mean: number, sd: number): number;
    };
    mean(values: number[]): number;
    stdev(values: number[], ofSample: boolean): number;
  };
  export default jstat;
}
