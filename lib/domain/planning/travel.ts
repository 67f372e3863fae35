/** A place on the earth, in degrees (WGS 84). */
export type Coordinates = { latitude: number; longitude: number };

/** Mean radius of the earth (IUGG), in kilometers. */
const EARTH_RADIUS_KM = 6371.0088;
const radians = (degrees: number) => (degrees * Math.PI) / 180;

/** The great circle's length by the haversine formula. */
export function greatCircleKm(a: Coordinates, b: Coordinates): number {
  const sinLatitude = Math.sin(radians(b.latitude - a.latitude) / 2);
  const sinLongitude = Math.sin(radians(b.longitude - a.longitude) / 2);
  const h = sinLatitude ** 2 + Math.cos(radians(a.latitude)) * Math.cos(radians(b.latitude)) * sinLongitude ** 2;
  return 2 * EARTH_RADIUS_KM * Math.asin(Math.min(1, Math.sqrt(h)));
}

/**
 * Roads are longer than the straight line: published ratios lie between 1.2 and 1.45, and short trips are more
 * winding than long ones (Giacomin and Levinson 2015, doi 10.1068/b130131p; Wang et al. 2024,
 * doi 10.1038/s44260-024-00023-x). Between the two ends the ratio falls evenly.
 */
const SHORT = { km: 2, ratio: 1.45 };
const LONG = { km: 50, ratio: 1.25 };

function circuity(km: number): number {
  const share = Math.min(1, Math.max(0, (km - SHORT.km) / (LONG.km - SHORT.km)));
  return SHORT.ratio + share * (LONG.ratio - SHORT.ratio);
}

/** Average speed on roads up to so many kilometers: an engineering assumption, not a measurement. */
const SPEEDS = [
  { upToKm: 3, kmPerHour: 22 },
  { upToKm: 10, kmPerHour: 32 },
  { upToKm: 30, kmPerHour: 50 },
  { upToKm: 80, kmPerHour: 68 },
  { upToKm: Number.POSITIVE_INFINITY, kmPerHour: 80 },
] as const;

/** Parking, and walking in. */
const AT_BOTH_ENDS_MINUTES = 3;

/** A faster road never makes a longer way shorter in time than the end of the slower class before it. */
function drivingMinutes(roadKm: number): number {
  let least = 0;
  for (const { upToKm, kmPerHour } of SPEEDS) {
    if (roadKm <= upToKm) return Math.max(least, (roadKm / kmPerHour) * 60);
    least = Math.max(least, (upToKm / kmPerHour) * 60);
  }
  return least;
}

/** An estimate without a map: good for comparing places, weak for short legs in town and across water. */
export function travelMinutes(from: Coordinates, to: Coordinates): number {
  const km = greatCircleKm(from, to);
  return Math.round(drivingMinutes(km * circuity(km)) + AT_BOTH_ENDS_MINUTES);
}
