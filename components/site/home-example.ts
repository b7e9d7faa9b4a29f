/** The request and the shortened answer on the home page, narrow enough for a phone; tests/unit/home-example.test.ts asks the core the same. */
export const apiRequest = `POST /api/v1/squareness
{ "length": "28'", "width": "22'",
  "diagonals": {
    "ac": "428 9/16",
    "bd": "428 1/16" },
  "burn": "1" }`;

export const apiAnswer = `{ "shape": "racked",
  "difference": {
    "text": "1/2\\"", … },
  "rack": {
    "side": "cd", "toward": "D",
    "distance": {
      "text": "5/16\\"",
      "lean": "strong", … } }, … }`;
