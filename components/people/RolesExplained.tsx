import { ROLE_WORDS } from "./role-words";

export function RolesExplained() {
  return (
    <dl className="flex flex-col gap-3 text-[0.9375rem]">
      {Object.values(ROLE_WORDS).map(({ name, may }) => (
        <div key={name}>
          <dt className="font-semibold">{name}</dt>
          <dd className="text-ink-soft">{may}</dd>
        </div>
      ))}
    </dl>
  );
}
