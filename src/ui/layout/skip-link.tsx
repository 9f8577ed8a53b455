/** First in the tab order: past the navigation, to what the page is about. */
export function SkipLink({
  href = "#main",
  children = "Skip to content",
}: {
  href?: string;
  children?: string;
}) {
  return (
    <a
      href={href}
      className="sr-only focus:not-sr-only focus:fixed focus:top-2 focus:left-2 focus:z-50 focus:rounded-control focus:bg-raised focus:px-4 focus:py-2 focus:font-medium"
    >
      {children}
    </a>
  );
}
