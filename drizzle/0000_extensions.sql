-- Trigram search for names; ranges beside keys in exclusion constraints.
CREATE EXTENSION IF NOT EXISTS pg_trgm;
--> statement-breakpoint
CREATE EXTENSION IF NOT EXISTS btree_gist;
--> statement-breakpoint

-- The clock of the record. Only the owner can shift it, and only the demo and the tests do: their history has to lie in
-- the past, and no client or application clock may decide a stored time.
CREATE TABLE record_clock (only_row boolean PRIMARY KEY DEFAULT true CHECK (only_row), shift interval NOT NULL);
--> statement-breakpoint
CREATE FUNCTION record_now() RETURNS timestamptz LANGUAGE sql STABLE AS $$
  SELECT now() + coalesce((SELECT shift FROM public.record_clock), interval '0')
$$;
