import {
  compilePolar,
  compileRotor,
  SOLVER,
  solvePoint,
  STANDARD_AIR,
  type Rotor,
} from '@tipward/bem-solver';
import { faultsOf, solverCase, type SolverCase, type SolverResultPoint } from '@tipward/contract';
import { locateJsonError } from '../json/locate-json-error.ts';

/** A case that cannot be solved; the message lists everything that is wrong with it. */
export class CaseError extends Error {
  constructor(lines: readonly string[]) {
    super(`The case cannot be solved:\n${lines.map((line) => `  - ${line}`).join('\n')}`);
    this.name = 'CaseError';
  }
}

function parseJson(text: string): unknown {
  try {
    return JSON.parse(text);
  } catch (error) {
    if (!(error instanceof SyntaxError)) throw error;
    const fault = locateJsonError(text);
    const where =
      fault === null ? error.message : `line ${fault.line}, column ${fault.column}: ${fault.message}`;
    throw new CaseError([`not JSON: ${where}`]);
  }
}

/** @throws CaseError with every fault: field, value and what is allowed; malformed JSON with line and column */
export function readCase(text: string): SolverCase {
  const input = parseJson(text.startsWith('\ufeff') ? text.slice(1) : text);
  const parsed = solverCase.safeParse(input);
  if (parsed.success) return parsed.data;
  const faults = faultsOf(parsed.error, input);
  throw new CaseError(
    faults.map(({ field, value, message }) =>
      message.startsWith('is not a field')
        ? `${field} is not a field of a case`
        : `${field === '' ? 'the case' : field} is ${value}; ${message}`,
    ),
  );
}

function compile({ rotor, polars, air, options }: SolverCase): Rotor {
  const compiled = new Map(Object.entries(polars).map(([name, table]) => [name, compilePolar(table)]));
  const stations = rotor.stations.map(({ polar: name, ...station }) => {
    const polar = compiled.get(name);
    // The schema refuses a station whose polar is not among those given.
    if (polar === undefined) throw new Error(`polar ${name} was not compiled`);
    return { ...station, polar };
  });
  const { densityKgM3 = STANDARD_AIR.densityKgM3, viscosityPaS = STANDARD_AIR.viscosityPaS } = air;
  const { sections: _sections, ...solverOptions } = options;
  return compileRotor({ ...rotor, stations }, { densityKgM3, viscosityPaS }, solverOptions);
}

function solve(rotor: Rotor, point: SolverCase['points'][number], sections: boolean): SolverResultPoint {
  const { windSpeedMS, pitchDeg } = point;
  const rotorSpeedRadS =
    point.rotorSpeedRpm === undefined
      ? ((point.tipSpeedRatio ?? 0) * windSpeedMS) / rotor.tipRadiusM
      : (point.rotorSpeedRpm * Math.PI) / 30;
  const result = solvePoint(rotor, { windSpeedMS, rotorSpeedRadS, pitchDeg }, { sections });
  return {
    windSpeedMS,
    // What was given is given back to the last digit.
    rotorSpeedRpm: point.rotorSpeedRpm ?? result.rotorSpeedRpm,
    tipSpeedRatio: point.tipSpeedRatio ?? result.tipSpeedRatio,
    pitchDeg,
    status: result.status,
    cp: result.cp,
    ct: result.ct,
    cq: result.cq,
    powerW: result.powerW,
    thrustN: result.thrustN,
    torqueNm: result.torqueNm,
    rootFlapMomentNm: result.rootFlapMomentNm,
    rootEdgeMomentNm: result.rootEdgeMomentNm,
    ...(result.sections === undefined ? {} : { sections: [...result.sections] }),
  };
}

/** The result as pieces of JSON text, one point at a time; points are solved as they are asked for. */
export function* solveCase(given: SolverCase): Generator<string> {
  const rotor = compile(given);
  yield `{"solver":${JSON.stringify({ name: SOLVER.name, version: SOLVER.version })},"points":[\n`;
  for (const [i, point] of given.points.entries()) {
    yield `${i === 0 ? '' : ',\n'}${JSON.stringify(solve(rotor, point, given.options.sections))}`;
  }
  yield '\n]}\n';
}
