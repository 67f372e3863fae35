import fc from "fast-check";
import { describe, expect, test } from "vitest";
import { greatCircleKm, travelMinutes } from "./travel";

const place = fc.record({
  latitude: fc.double({ min: 25, max: 49, noNaN: true }),
  longitude: fc.double({ min: -124, max: -67, noNaN: true }),
});

describe("great circle", () => {
  // A degree of a great circle on a sphere of 6371.0088 km: pi / 180 * R = 111.195 km.
  test("a degree along a meridian and along the equator", () => {
    expect(greatCircleKm({ latitude: 40, longitude: -90 }, { latitude: 41, longitude: -90 })).toBeCloseTo(111.195, 2);
    expect(greatCircleKm({ latitude: 0, longitude: 10 }, { latitude: 0, longitude: 11 })).toBeCloseTo(111.195, 2);
  });

  // Worked example of Ed Williams' Aviation Formulary: LAX to JFK is 0.623585 rad, on a sphere of any radius.
  test("Los Angeles to New York", () => {
    const km = greatCircleKm(
      { latitude: 33 + 57 / 60, longitude: -(118 + 24 / 60) },
      { latitude: 40 + 38 / 60, longitude: -(73 + 47 / 60) },
    );
    expect(km / 6371.0088).toBeCloseTo(0.623585, 5);
  });
});

describe("travel", () => {
  test("is the same there and back, and nobody arrives before parking", () => {
    fc.assert(
      fc.property(place, place, (a, b) => {
        expect(travelMinutes(a, b)).toBe(travelMinutes(b, a));
        expect(travelMinutes(a, b)).toBeGreaterThanOrEqual(3);
      }),
    );
  });

  test("never grows shorter as the way grows longer", () => {
    const from = { latitude: 40, longitude: -90 };
    const minutes = Array.from({ length: 400 }, (_, i) =>
      travelMinutes(from, { latitude: 40 + i / 250, longitude: -90 }),
    );
    expect(minutes).toEqual([...minutes].sort((a, b) => a - b));
    expect(new Set(minutes).size).toBeGreaterThan(50);
  });

  // By hand: 10 km in a straight line, ratio 1.45 - 8/48 * 0.2 = 1.4167, 14.17 km of road at 50 km/h would be 17 min,
  // which is less than the end of the class before (10 km at 32 km/h, 18.75 min); and three minutes at the ends.
  test("ten kilometers take 22 minutes", () => {
    const tenKm = 10 / 111.195;
    expect(travelMinutes({ latitude: 40, longitude: -90 }, { latitude: 40 + tenKm, longitude: -90 })).toBe(22);
  });
});
