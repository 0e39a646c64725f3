/** Area of a section over the square of its width across the flats (or diameter). */
export const sectionShare = { square: 1, octagonal: 2 * Math.tan(Math.PI / 8), round: Math.PI / 4 } as const;
