export const metadata = { title: 'A bare page', description: 'Nothing but text.' }

export default function Layout({ children }) {
  return (
    <html lang="en-GB">
      <body>{children}</body>
    </html>
  )
}
