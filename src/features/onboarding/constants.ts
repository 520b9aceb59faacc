export const THERAPIES = { injections: "Injections", pump: "A pump", "closed-loop": "Another closed loop" } as const;
