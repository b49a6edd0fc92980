import { TextField } from "@/components/ui/text-field";

type Wrong = (name: string) => string | undefined;

export function EmailField({ wrong, label = "E-mail", hint, id = "email" }: { wrong: Wrong; label?: string; hint?: string; id?: string }) {
  return (
    <TextField
      id={id}
      name="email"
      type="email"
      autoComplete="email"
      inputMode="email"
      spellCheck={false}
      required
      label={label}
      hint={hint}
      error={wrong("email")}
    />
  );
}

export function PasswordField({
  wrong,
  label = "Password",
  name = "password",
  id = name,
}: {
  wrong: Wrong;
  label?: string;
  name?: string;
  id?: string;
}) {
  return <TextField id={id} name={name} type="password" autoComplete="current-password" required label={label} error={wrong(name)} />;
}

export function NewPasswordField({ wrong, label = "Password" }: { wrong: Wrong; label?: string }) {
  return (
    <TextField
      id="password"
      name="password"
      type="password"
      autoComplete="new-password"
      required
      minLength={10}
      label={label}
      hint="At least 10 characters; a few words do well."
      error={wrong("password")}
    />
  );
}

export function NameField({ wrong, value }: { wrong: Wrong; value?: string }) {
  return (
    <TextField
      id="name"
      name="name"
      autoComplete="name"
      required
      maxLength={80}
      defaultValue={value}
      label="Your name"
      hint="It stands in the log beside what you did."
      error={wrong("name")}
    />
  );
}
