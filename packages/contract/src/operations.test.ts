import { describe, expect, it } from 'vitest';
import { operations } from './operations.ts';

describe('operations', () => {
  it('have one id and one method and path each', () => {
    const ids = operations.map((operation) => operation.id);
    const places = operations.map(
      (operation) => `${operation.method} ${operation.path.replace(/:\w+/gu, ':')}`,
    );
    expect(new Set(ids).size).toBe(ids.length);
    expect(new Set(places).size).toBe(places.length);
  });
  it('state a parameter schema exactly when the path has parameters', () => {
    for (const operation of operations)
      expect(operation.params !== null, operation.id).toBe(operation.path.includes(':'));
  });
  it('answer 204 exactly when there is no body to answer with', () => {
    for (const operation of operations) {
      const empty = operation.response === null && operation.binary === undefined;
      expect(empty, operation.id).toBe(operation.status === 204 || operation.status === 202);
    }
  });
});
