/** Says whose account a form is about, and tells password managers. */
export function AccountOf({ email }: { email: string }) {
  return (
    <>
      <p className="text-[0.9375rem]">
        Account of <strong className="break-all">{email}</strong>
      </p>
      <input type="text" hidden readOnly autoComplete="username" value={email} />
    </>
  );
}
