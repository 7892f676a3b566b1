// Addresses of tonight's JSON: the SWR keys of the server's fallback and the browser's hooks.

export const outlookKey = (rinkId: string) => `/api/rinks/${rinkId}/outlook`

export const checkOffsPath = (rinkId: string) => `/api/rinks/${rinkId}/check-offs`

/** The night and its judgement are in the key, so that a newer judgement is a newer model. */
export const nightModelKey = (rinkId: string, nightDate: string, judgedAt: string) =>
  `/api/rinks/${rinkId}/night-model?${new URLSearchParams({ night: nightDate, judged: judgedAt })}`
