/** Corners are A to Z, counter-clockwise; a side is named by its two corners, `ab`, and the last returns to A. */
export const mostCorners = 26;

export function cornerName(index: number): string {
  return String.fromCharCode(65 + index);
}

export function cornerNames(count: number): string[] {
  return Array.from({ length: count }, (_, index) => cornerName(index));
}

/** The side that begins at a corner, such as `ab`, or `fa` for the last of six. */
export function sideName(index: number, count: number): string {
  return (cornerName(index) + cornerName((index + 1) % count)).toLowerCase();
}

export function sideNames(count: number): string[] {
  return Array.from({ length: count }, (_, index) => sideName(index, count));
}
