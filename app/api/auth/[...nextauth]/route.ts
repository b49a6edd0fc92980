import { handlers } from "@/lib/server/auth/next-auth";

export const { GET, POST } = handlers;
