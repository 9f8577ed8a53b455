import type { Role } from "@/db/vocabulary";
import type { NavigationItem } from "@/ui/layout/navigation";

type Place = NavigationItem & { for: readonly Role[] };

const staff: readonly Role[] = ["counter", "technician", "manager"];

const places: readonly Place[] = [
  { href: "/", label: "Today", for: staff },
  { href: "/sets", label: "Sets", for: staff },
  { href: "/bench", label: "Bench", for: ["technician"] },
  { href: "/certificates", label: "Certificates", for: staff },
  { href: "/customers", label: "Customers", for: ["counter", "manager"] },
  { href: "/models", label: "Injector models", for: staff },
  { href: "/calibration", label: "Calibration", for: staff },
  { href: "/people", label: "People", for: ["manager"] },
  { href: "/activity", label: "Activity", for: ["manager"] },
  { href: "/settings", label: "Lab settings", for: ["manager"] },
];

/** Where somebody with these roles has something to do. What they may do there is decided elsewhere. */
export function navigationFor(roles: readonly Role[]): NavigationItem[] {
  return places
    .filter((place) => place.for.some((role) => roles.includes(role)))
    .map(({ for: _roles, ...item }) => item);
}
