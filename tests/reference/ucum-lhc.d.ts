/** The package ships no types; this is the part the checks use. */
declare module '@lhncbc/ucum-lhc' {
  interface Conversion {
    status: 'succeeded' | 'failed' | 'error';
    toVal: number | null;
  }
  export class UcumLhcUtils {
    static getInstance(): UcumLhcUtils;
    convertUnitTo(fromUnit: string, value: number, toUnit: string): Conversion;
  }
}
