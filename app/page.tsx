export const dynamic = 'force-dynamic';

export default function Home() {
  return <main>Tarebook</main>;
}
