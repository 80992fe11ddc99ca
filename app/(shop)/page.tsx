export default function TidelinePage() {
  return <h1>Tideline</h1>;
}
