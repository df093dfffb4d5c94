/** The name of the page in the browser's tab and history. */
export function PageTitle({ children }: { children: string }) {
  return <title>{`${children} · thudline`}</title>;
}
