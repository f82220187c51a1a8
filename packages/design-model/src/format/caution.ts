/** Shown wherever numbers could reach a built blade: footer, releases, exports. */
export const CAUTION =
  'Steady BEM results are for design work. They are not certified loads: ultimate and fatigue loads need the load cases ' +
  'of IEC 61400-1/-2 with a validated aeroelastic model; structural, noise and site permits follow local codes and ' +
  'licensed practice.';
