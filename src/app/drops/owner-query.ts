/** The query of links to a product's pages: a product of another team is named with its owner. */
export function ownerQuery({ team }: { team: string }, teamKey: string): { owner?: string } {
  return team === teamKey ? {} : { owner: team };
}
