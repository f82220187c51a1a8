import type { DesignContent, Specification, Station } from '@tipward/contract';
import type { AirfoilData } from '@tipward/design-model';
import { retwistContent, sizeFromSpecification } from '@tipward/design-model';

const round = (value: number, digits: number) => Number(value.toFixed(digits));

const smoothStep = (share: number) => {
  const t = Math.min(1, Math.max(0, share));
  return t * t * (3 - 2 * t);
};

function mapStations(content: DesignContent, change: (station: Station) => Station): DesignContent {
  return { ...content, stations: content.stations.map(change) };
}

/** The chord of a blade sized anew under a cap, its twist left as it was. */
export function capChord(
  content: DesignContent,
  specification: Specification,
  airfoils: readonly AirfoilData[],
  capM: number,
  designLift: number,
): DesignContent {
  const { stations } = sizeFromSpecification({
    specification,
    airfoils,
    tipSpeedRatio: content.designTipSpeedRatio,
    designLift,
    maxChordM: capM,
    stationCount: content.stations.length,
  });
  return {
    ...content,
    stations: content.stations.map((station, i) => ({
      ...station,
      chordM: stations[i]?.chordM ?? station.chordM,
    })),
  };
}

/** Twist for maximum power under the chord as it is. */
export function reviseTwist(
  content: DesignContent,
  specification: Specification,
  airfoils: readonly AirfoilData[],
): DesignContent {
  return retwistContent({ content, specification, airfoils });
}

/** Thicker sections between root and mid-span. */
export function thickenRoot(content: DesignContent, tipRadiusM: number): DesignContent {
  return mapStations(content, (station) => {
    const share = station.radiusM / tipRadiusM;
    const inside = smoothStep((share - 0.15) / 0.1) * (1 - smoothStep((share - 0.4) / 0.2));
    return { ...station, thicknessPct: round(Math.min(100, station.thicknessPct * (1 + 0.14 * inside)), 1) };
  });
}

/** Less chord toward the tip. */
export function trimTip(content: DesignContent, tipRadiusM: number, by: number): DesignContent {
  return mapStations(content, (station) => ({
    ...station,
    chordM: round(station.chordM * (1 - by * smoothStep((station.radiusM / tipRadiusM - 0.65) / 0.3)), 3),
  }));
}

/** A little more twist over the middle of the span. */
export function easeMiddle(content: DesignContent, tipRadiusM: number, byDeg: number): DesignContent {
  return mapStations(content, (station) => {
    const share = station.radiusM / tipRadiusM;
    const inside = smoothStep((share - 0.3) / 0.15) * (1 - smoothStep((share - 0.6) / 0.2));
    return { ...station, twistDeg: round(station.twistDeg + byDeg * inside, 2) };
  });
}
