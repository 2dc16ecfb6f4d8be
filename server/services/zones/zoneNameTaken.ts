/** What is said when another zone has the name already. */
export function zoneNameTaken(name: string) {
  return { field: 'name', reason: `There is a zone named "${name}" already.` }
}
