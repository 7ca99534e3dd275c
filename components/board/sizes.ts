/** How far a pixel reaches on the screen that the board is made for: 43 inch, 1920 × 1080. */
export const MM_PER_PX = 0.49;

/** Height of Barlow Condensed's capitals as a share of its font size (from the font's OS/2 table). */
export const CAP_RATIO = 0.7;

/**
 * Heights of capitals in pixels of a 1920 × 1080 screen; every other screen scales them. From the
 * legibility angles of ISO 9241-303: 58 mm for the called code, 46.5 mm for codes (10 m), 23 mm for
 * states (5 m).
 */
export const CAP_PX = { called: 119, code: 95, state: 47 } as const;

/** The height in millimetres of capitals that are `capPx` pixels high on that screen. */
export const capMm = (capPx: number): number => capPx * MM_PER_PX;
