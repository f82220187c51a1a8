/** A fault's field ('requirements[0].limit') as the form names it ('requirements.0.limit'). */
export function fieldPath(field: string): string {
  return field.replaceAll(/\[(\d+)\]/gu, '.$1');
}
