// The package "server-only" throws outside a React Server build; tests stand on the server's side.
export {};
