/** What the test command hands to the tests that need a database, a built server or a browser. */
export function fromTestCommand(name: string): string {
  const value = process.env[name]
  if (!value) throw new Error(`${name} is not set. Run these tests through "npm test", which prepares what they need.`)
  return value
}
