export default function Page() { return <p>Rowrise</p>; }
