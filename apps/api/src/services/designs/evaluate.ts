import { createHash } from 'node:crypto';
import type { DesignContent, Evaluation } from '@tipward/contract';
import { canonicalJson, evaluateContent } from '@tipward/design-model';
import type { DesignInputs } from './load-inputs.ts';

const hashContent = (content: DesignContent): string =>
  createHash('sha256').update(canonicalJson(content)).digest('hex');

/** The evaluation of record: the same package as in the browser, run here. */
export function evaluate(content: DesignContent, { issue, airfoils }: DesignInputs): Evaluation {
  const named = airfoils.map((row) => ({
    name: content.airfoils.find((pin) => pin.airfoilId === row.id)?.name ?? row.name,
    thicknessPct: row.thicknessPct,
    outline: row.outline,
    polars: row.polars,
    polarSetHash: row.polarSetHash,
  }));
  return evaluateContent({
    content,
    contentHash: hashContent(content),
    specification: issue.specification,
    specificationHash: issue.specificationHash,
    requirements: issue.requirements,
    airfoils: named,
  });
}
