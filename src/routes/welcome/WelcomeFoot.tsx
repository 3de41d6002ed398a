import { Link } from 'react-router-dom';

const POINTS = [
  {
    title: 'Three answers to every pour',
    text: 'Pour, mind or hold, with the reason and what to do about it.',
  },
  {
    title: 'One plan for the team',
    text: 'Head brewer, brewers and tasters see the same shelf.',
  },
  {
    title: 'Numbers with their sources',
    text: 'Each limit names what it rests on, or says that it is common practice.',
  },
];

export function WelcomeFoot() {
  return (
    <footer className="on-bar grid grid-cols-[1fr_1fr_1fr_auto] items-start gap-x-11 gap-y-5 bg-bar px-14 pt-6 pb-7 text-on-bar max-wide:grid-cols-2 max-wide:px-10 max-tablet:grid-cols-1 max-tablet:px-5">
      {POINTS.map((point) => (
        <div key={point.title}>
          <h2 className="text-h3 font-[680]">{point.title}</h2>
          <p className="mt-0.5 text-body text-on-bar2">{point.text}</p>
        </div>
      ))}
      <Link to="/about/checks" className="py-1 text-body underline underline-offset-4">
        How the checks work
      </Link>
    </footer>
  );
}
