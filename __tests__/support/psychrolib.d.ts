declare module 'psychrolib' {
  const psychrolib: {
    SI: number;
    SetUnitSystem(system: number): void;
    GetTDewPointFromRelHum(dryBulb: number, relativeHumidity: number): number;
    GetSatVapPres(dryBulb: number): number;
  };
  export = psychrolib;
}
