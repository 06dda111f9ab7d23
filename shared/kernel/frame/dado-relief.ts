/**
 * How much longer a stopped dado is cut at its end, so that a square panel end with side clearance c/2 passes the round
 * corners a cutter of radius r leaves: r − √(r² − (r − c/2)²). For c = 0 it is r, for c/2 ≥ r nothing. Plane geometry.
 */
export function dadoRelief(radius: number, clearance: number): number {
  const reach = radius - clearance / 2;
  return reach <= 0 ? 0 : radius - Math.sqrt(radius * radius - reach * reach);
}
