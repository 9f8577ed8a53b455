/**
 * Density of liquid n-heptane at 101.325 kPa: [°C, kg/m³].
 * R. Span and W. Wagner, Int. J. Thermophys. 24 (2003) 41-109, short equation of state for non-polar fluids, evaluated
 * with the CoolProp library; the equation's own uncertainty is about 0.2 %.
 */
export const nHeptaneDensity: readonly (readonly [number, number])[] = [
  [0, 700.53],
  [10, 692.2],
  [15, 688.015],
  [20, 683.815],
  [25, 679.598],
  [30, 675.362],
  [32, 673.661],
  [40, 666.822],
];
