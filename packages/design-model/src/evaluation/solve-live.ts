import { maximumCp, solveCurve, solvePoint } from '@tipward/bem-solver';
import type { DesignContent, Evaluation, SpanPoint, Specification } from '@tipward/contract';
import type { AirfoilData } from '../airfoil-data.ts';
import type { LiveResult } from './live-result.ts';
import type { PreparedRotor } from './rotor-input.ts';
import { prepareRotor } from './rotor-input.ts';
import { collectWarnings } from './warnings.ts';

export interface LiveInput {
  readonly content: DesignContent;
  readonly specification: Specification;
  readonly airfoils: readonly AirfoilData[];
  /** Tip-speed ratio the spanwise state is shown at; null takes the design's. */
  readonly tipSpeedRatio: number | null;
}

const LAMBDA_STEP = 0.2;

/** Tip-speed ratios of the curve: from 1 to well past the design's, evenly spaced. */
function curveRatios(designRatio: number): number[] {
  const top = Math.max(12, Math.ceil(designRatio * 1.6));
  return Array.from({ length: Math.round((top - 1) / LAMBDA_STEP) + 1 }, (_, i) =>
    Number((1 + i * LAMBDA_STEP).toFixed(6)),
  );
}

/** The state along the span at one tip-speed ratio and the content's pitch, at rated rotor speed. */
function solveSpan(
  prepared: PreparedRotor,
  spec: Specification,
  pitchDeg: number,
  tipSpeedRatio: number,
): Evaluation['span'] {
  const windSpeedMS = (prepared.rotorSpeedRadS * spec.tipRadiusM) / tipSpeedRatio;
  const point = solvePoint(
    prepared.rotor,
    { windSpeedMS, rotorSpeedRadS: prepared.rotorSpeedRadS, pitchDeg },
    { sections: true },
  );
  const points = prepared.elements.map((element, i): SpanPoint => {
    const s = point.sections?.[i];
    const alphaDeg = s?.alphaDeg ?? null;
    return {
      radiusM: element.radiusM,
      chordM: element.chordM,
      twistDeg: element.twistDeg,
      thicknessPct: element.thicknessPct,
      status: s?.status ?? 'no-solution',
      inflowDeg: s?.inflowDeg ?? null,
      alphaDeg,
      axialInduction: s?.axialInduction ?? null,
      tangentialInduction: s?.tangentialInduction ?? null,
      lossFactor: s?.lossFactor ?? null,
      cl: s?.cl ?? null,
      cd: s?.cd ?? null,
      relativeSpeedMS: s?.relativeSpeedMS ?? null,
      normalForceNM: s?.normalForceNM ?? null,
      tangentialForceNM: s?.tangentialForceNM ?? null,
      reynolds: s?.reynolds ?? null,
      stallMarginDeg: element.stallDeg === null || alphaDeg === null ? null : element.stallDeg - alphaDeg,
    };
  });
  return { tipSpeedRatio, windSpeedMS, pitchDeg, points };
}

/** What changes at every key: Cp–λ at the design's pitch with its maximum, the spanwise state and the warnings. */
export function solveLive({ content, specification, airfoils, tipSpeedRatio }: LiveInput): LiveResult {
  const prepared = prepareRotor(content, specification, airfoils);
  const ratios = curveRatios(content.designTipSpeedRatio);
  const curve = solveCurve(prepared.rotor, { pitchDeg: content.pitchDeg, tipSpeedRatios: ratios });
  const best = maximumCp(prepared.rotor, {
    pitchDeg: content.pitchDeg,
    lambdaMin: ratios[0] ?? 1,
    lambdaMax: ratios.at(-1) ?? 12,
  });
  const span = solveSpan(
    prepared,
    specification,
    content.pitchDeg,
    tipSpeedRatio ?? content.designTipSpeedRatio,
  );
  const number = (value: number | undefined) =>
    value === undefined || !Number.isFinite(value) ? null : value;
  return {
    curve: {
      pitchDeg: content.pitchDeg,
      tipSpeedRatio: ratios,
      cp: ratios.map((_, i) => number(curve.cp[i])),
      ct: ratios.map((_, i) => number(curve.ct[i])),
    },
    maxCp: best?.cp ?? null,
    tipSpeedRatioAtMaxCp: best?.tipSpeedRatio ?? null,
    ctAtMaxCp: best?.ct ?? null,
    span,
    warnings: collectWarnings(content, specification, prepared, span),
  };
}
