type Box = { left: number; top: number; width: number; height: number };

const SEGMENTS = 4;
const round = (n: number) => Math.round(n * 100) / 100;

/**
 * The curve of the mark, speed = e^(-rate·t) for t from 0 to 1, as an SVG path in a box.
 * Each segment meets the exponential in both ends and in both slopes.
 */
export function coastPath({ left, top, width, height }: Box, rate: number): string {
  const x = (t: number) => round(left + t * width);
  const y = (speed: number) => round(top + (1 - speed) * height);
  const speed = (t: number) => Math.exp(-rate * t);
  const slope = (t: number) => -rate * speed(t);
  const step = 1 / SEGMENTS;
  const bends = Array.from({ length: SEGMENTS }, (_, i) => {
    const [from, to] = [i * step, (i + 1) * step];
    const first = `${x(from + step / 3)} ${y(speed(from) + (slope(from) * step) / 3)}`;
    const second = `${x(to - step / 3)} ${y(speed(to) - (slope(to) * step) / 3)}`;
    return `C${first} ${second} ${x(to)} ${y(speed(to))}`;
  });
  return `M${x(0)} ${y(1)}${bends.join("")}`;
}
