import { buttonLook } from "@/components/ui/button-look";

/** A button on the deep ground of the workshop's head. */
export const onDeep = (className = ""): string =>
  buttonLook("plain", "normal", false, `border-on-deep/45! bg-transparent! text-on-deep! ${className}`);
