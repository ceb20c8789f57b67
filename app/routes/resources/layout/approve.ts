export const action = () => Response.json({ message: "Not built yet" }, { status: 501 });
