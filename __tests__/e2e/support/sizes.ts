/** A phone and a desk, as the projects have them. */
export const phone = { viewport: { width: 390, height: 844 }, hasTouch: true, isMobile: true };
export const desk = { viewport: { width: 1440, height: 900 } };
