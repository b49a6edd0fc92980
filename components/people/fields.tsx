import { TextField } from "@/components/ui/text-field";
import { SecretField } from "./secret-field";

type Wrong = (name: string) => string | undefined;

type EmailProps = { wrong: Wrong; label?: string; hint?: string; id?: string; value?: string | undefined };

export function EmailField({ wrong, label = "E-mail", hint, id = "email", value }: EmailProps) {
  return (
    <TextField
      id={id}
      name="email"
      type="email"
      autoComplete="email"
      inputMode="email"
      spellCheck={false}
      required
      defaultValue={value}
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
  return <SecretField id={id} name={name} autoComplete="current-password" label={label} error={wrong(name)} />;
}

export function NewPasswordField({ wrong, label = "Password" }: { wrong: Wrong; label?: string }) {
  return (
    <SecretField
      id="password"
      name="password"
      autoComplete="new-password"
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

export function FleetNameField({ wrong }: { wrong: Wrong }) {
  return (
    <TextField
      id="fleetName"
      name="fleetName"
      required
      maxLength={80}
      label="What shall the fleet be called?"
      hint="A fleet is one boat or many. Only its own people see what is in it."
      error={wrong("fleetName")}
    />
  );
}
