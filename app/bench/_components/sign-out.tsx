/** Ends the session of this screen. A plain form: it works whatever else does not. */
export function SignOut() {
  return (
    <form method="post" action="/sign-out">
      <button type="submit" className="min-h-12 underline underline-offset-4">
        Sign out
      </button>
    </form>
  );
}
