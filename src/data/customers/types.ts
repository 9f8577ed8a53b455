export type CustomerRow = {
  customerId: string;
  name: string;
  contactName: string | null;
  phone: string | null;
  sets: number;
  /** Not handed over yet. */
  setsHere: number;
  lastCheckIn: Date | null;
};

export type CustomerDetail = {
  customerId: string;
  name: string;
  version: number;
  /** Null for technicians. */
  contact: { contactName: string; email: string; phone: string; address: string } | null;
  /** Null for technicians and for the customer's own people. */
  internalNote: string | null;
  since: Date;
  /** Who may sign in for this customer. */
  people: { personId: string; name: string; active: boolean }[];
};
