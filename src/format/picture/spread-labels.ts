export type PlacedLabel<Label> = { label: Label; wantedY: number; y: number };

type Group<Label> = { members: { label: Label; wantedY: number }[]; centre: number };

/**
 * Moves labels apart along one axis so that neighbours keep `gap` between them, each as near as can be to where it wants to
 * stand, inside `low` and `high`. Groups that touch are merged and stand around their own mean.
 */
export function spreadLabels<Label>(
  wanted: readonly { label: Label; y: number }[],
  { gap, low, high }: { gap: number; low: number; high: number },
): PlacedLabel<Label>[] {
  const sorted = wanted.map(({ label, y }) => ({ label, wantedY: y })).sort((a, b) => a.wantedY - b.wantedY);
  const tight = sorted.length > 1 ? Math.min(gap, (high - low) / (sorted.length - 1)) : gap;
  const groups: Group<Label>[] = [];
  for (const member of sorted) {
    groups.push(settled([member], tight, low, high));
    while (groups.length > 1 && overlap(groups.at(-2)!, groups.at(-1)!, tight)) {
      const second = groups.pop()!;
      const first = groups.pop()!;
      groups.push(settled([...first.members, ...second.members], tight, low, high));
    }
  }
  return groups.flatMap((group) =>
    group.members.map((member, index) => ({ ...member, y: startOf(group, tight) + index * tight })),
  );
}

function settled<Label>(
  members: Group<Label>["members"],
  gap: number,
  low: number,
  high: number,
): Group<Label> {
  const half = ((members.length - 1) * gap) / 2;
  const mean = members.reduce((sum, { wantedY }) => sum + wantedY, 0) / members.length;
  return { members, centre: Math.max(low + half, Math.min(high - half, mean)) };
}

function startOf<Label>({ members, centre }: Group<Label>, gap: number): number {
  return centre - ((members.length - 1) * gap) / 2;
}

function overlap<Label>(first: Group<Label>, second: Group<Label>, gap: number): boolean {
  const endOfFirst = startOf(first, gap) + (first.members.length - 1) * gap;
  return startOf(second, gap) - endOfFirst < gap - 1e-9;
}
