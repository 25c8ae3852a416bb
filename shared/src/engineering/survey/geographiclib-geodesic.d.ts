// The package names a typings file that it does not ship, so the few calls used here are declared by hand.
declare module 'geographiclib-geodesic' {
  interface GeodesicLine {
    /** Metres. */
    s12?: number
    /** Degrees clockwise from north at the first point. */
    azi1?: number
  }
  interface PolygonResult {
    /** Metres. */
    perimeter: number
    /** Square metres, negative when the ring runs clockwise. */
    area: number
  }
  interface GeodesicPolygon {
    AddPoint(lat: number, lon: number): void
    Compute(reverse: boolean, sign: boolean): PolygonResult
  }
  interface Ellipsoid {
    Inverse(lat1: number, lon1: number, lat2: number, lon2: number): GeodesicLine
    Polygon(polyline: boolean): GeodesicPolygon
  }
  const geodesic: { Geodesic: { WGS84: Ellipsoid } }
  export default geodesic
}
