import type { DesignContent, Evaluation } from '@tipward/contract';

/** A cell of a CSV: quoted where it must be; text that a spreadsheet would run as a formula is defused with an apostrophe. */
function csvCell(value: string | number | null): string {
  if (value === null) return '';
  if (typeof value === 'number') return String(value);
  const safe = /^[=+\-@\t\r]/u.test(value) ? `'${value}` : value;
  return /[",\r\n]/u.test(safe) ? `"${safe.replaceAll('"', '""')}"` : safe;
}

/** RFC 4180 lines, header first. */
export function csvText(
  header: readonly string[],
  rows: readonly (readonly (string | number | null)[])[],
): string {
  return [header, ...rows].map((row) => row.map(csvCell).join(',')).join('\r\n') + '\r\n';
}

/** Station table with units in the header; reads back through parseStationBlock to the same numbers. */
export function stationsCsv(content: DesignContent): string {
  return csvText(
    ['radius [m]', 'chord [m]', 'twist [deg]', 'thickness [%]', 'airfoil'],
    content.stations.map((s) => [s.radiusM, s.chordM, s.twistDeg, s.thicknessPct, s.airfoil ?? 'blended']),
  );
}

/** Cp–λ table of an evaluation at its pitch. */
export function curveCsv(evaluation: Evaluation): string {
  const { curve } = evaluation;
  return csvText(
    ['pitch [deg]', 'tip-speed ratio [-]', 'CP [-]', 'CT [-]'],
    curve.tipSpeedRatio.map((lambda, i) => [
      curve.pitchDeg,
      lambda,
      curve.cp[i] ?? null,
      curve.ct[i] ?? null,
    ]),
  );
}

/** Operating schedule with power, thrust and root moments against wind speed. */
export function scheduleCsv(evaluation: Evaluation): string {
  return csvText(
    [
      'wind speed [m/s]',
      'rotor speed [rpm]',
      'pitch [deg]',
      'tip-speed ratio [-]',
      'governed by',
      'CP [-]',
      'CT [-]',
      'rotor power [kW]',
      'electrical power [kW]',
      'thrust [kN]',
      'root flapwise moment [kN m]',
      'root edgewise moment [kN m]',
      'status',
    ],
    evaluation.schedule.map((p) => [
      p.windSpeedMS,
      p.rotorSpeedRpm,
      p.pitchDeg,
      p.tipSpeedRatio,
      p.governedBy,
      p.cp,
      p.ct,
      p.powerKW,
      p.electricalPowerKW,
      p.thrustKN,
      p.rootFlapMomentKNm,
      p.rootEdgeMomentKNm,
      p.status,
    ]),
  );
}
