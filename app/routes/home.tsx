export default function Home() {
  return <main><h1>Cartonwright</h1></main>;
}
