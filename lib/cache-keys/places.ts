// Addresses of the place finder: by name, and by position.

export const placesKey = (query: string) => `/api/places?${new URLSearchParams({ q: query })}`

export const positionKey = (latitude: string, longitude: string) =>
  `/api/places?${new URLSearchParams({ latitude, longitude })}`
