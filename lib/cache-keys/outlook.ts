// The SWR key of tonight's view, which is also its address: shared by the server's fallback and the browser's hook.

export const outlookKey = (rinkId: string) => `/api/rinks/${rinkId}/outlook`
