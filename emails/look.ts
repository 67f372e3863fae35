/** Mail programs know no style sheets of ours: the colors of the product, repeated once. */
export const LOOK = {
  ground: "#f6f4ef",
  surface: "#fffdf9",
  ink: "#17222d",
  steel: "#5b6b7a",
  line: "#d9d5cb",
  still: "#0e6b6b",
  onStill: "#ffffff",
  font: "Verdana, Arial, sans-serif",
} as const;
