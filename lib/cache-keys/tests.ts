// Addresses of tests that were sent, and of what became of them.

export const TESTS_PATH = '/api/test-messages'
export const testKey = (messageId: string) => `${TESTS_PATH}/${messageId}`
