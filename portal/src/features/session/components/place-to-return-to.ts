/** Where sign-in leads: the place that asked for it, if it is one of ours, else Tonight. */
export function placeToReturnTo(next: string | null): string {
  return next && /^\/(?![/\\])/.test(next) ? next : '/';
}
