/** Design plastic resistance of a gross section in shear, N: `A_v f_y/(sqrt(3) gamma_M0)`. EN 1993-1-1:2005, 6.2.6(2). */
export function shearYield(Av: number, fy: number, gammaM0: number): number {
  return (Av * fy) / (Math.sqrt(3) * gammaM0);
}

/**
 * Design resistance of a net section in shear, N: `A_v,net f_u/(sqrt(3) gamma_M2)`, as handbooks of simple connections
 * take it where EN 1993-1-1:2005, 6.2.6(7) sends holes to the connection zone. mm2, MPa.
 */
export function shearRupture(Avnet: number, fu: number, gammaM2: number): number {
  return (Avnet * fu) / (Math.sqrt(3) * gammaM2);
}
