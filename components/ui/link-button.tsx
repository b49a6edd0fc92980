import Link from "next/link";
import type { ComponentProps } from "react";
import { buttonLook, type Size, type Tone } from "./button-look";

type Props = ComponentProps<typeof Link> & { tone?: Tone; size?: Size; wide?: boolean };

/** A link that leads to the next thing to do. */
export function LinkButton({ tone = "plain", size = "normal", wide = false, className, ...rest }: Props) {
  return <Link className={buttonLook(tone, size, wide, className)} {...rest} />;
}
