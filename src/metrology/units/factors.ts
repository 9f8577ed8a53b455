/** Grams in a pound (avoirdupois), exact. NIST SP 811 (2008), Appendix B. */
export const gramsPerPound = 453.59237;

/** Kilopascals in a pound-force per square inch: 0.45359237 · 9.80665 / 0.0254² / 1000. NIST SP 811 (2008), Appendix B. */
export const kilopascalsPerPsi = 6.894757293168361;

/** Kilopascals in a bar, exact. NIST SP 811 (2008), Appendix B. */
export const kilopascalsPerBar = 100;
