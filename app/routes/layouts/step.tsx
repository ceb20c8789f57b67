import { useLoaderData } from "react-router";
export const loader = () => ({ stub: true });
export default function Stub() {
  return <p>Not built yet {String(useLoaderData<typeof loader>().stub)}</p>;
}
