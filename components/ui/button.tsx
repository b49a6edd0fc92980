import type { ComponentProps } from "react";
import { buttonLook, type Size, type Tone } from "./button-look";

type Props = ComponentProps<"button"> & { tone?: Tone; size?: Size; wide?: boolean };

export function Button({ tone = "plain", size = "normal", wide = false, className, type = "button", ...rest }: Props) {
  return <button type={type} className={buttonLook(tone, size, wide, className)} {...rest} />;
}
