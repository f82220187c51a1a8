/** Reference and annual mean wind speed at hub height (m/s) of the classes of IEC 61400-1; the mean is 0.2 of the reference. */
export const WIND_CLASSES = {
  I: { referenceMS: 50, meanMS: 10 },
  II: { referenceMS: 42.5, meanMS: 8.5 },
  III: { referenceMS: 37.5, meanMS: 7.5 },
} as const;

export type WindClass = keyof typeof WIND_CLASSES;
