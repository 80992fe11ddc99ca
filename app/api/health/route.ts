/** The process lives and answers. Whether all it needs is there, /api/ready says. */
export const GET = (): Response => Response.json({ live: true });
