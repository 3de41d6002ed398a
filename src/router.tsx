import { createBrowserRouter, type RouteObject } from 'react-router-dom';
import { tellTheWay } from './app/lazyPage.ts';
import { lazyRoute } from './app/lazyRoute.tsx';
import { Root } from './app/Root.tsx';
import { ErrorPage } from './routes/error/ErrorPage.tsx';
import { NotFoundPage } from './routes/error/NotFoundPage.tsx';

/** Pages of a brewery: in its current season, or in the one that the address names. */
const ofBrewery = {
  lazy: () => lazyRoute(async () => (await import('./routes/shell/Shell.tsx')).Shell),
  errorElement: <ErrorPage />,
  children: [
    {
      index: true,
      lazy: () => lazyRoute(async () => (await import('./routes/board/BoardPage.tsx')).BoardPage),
    },
    {
      path: 'today',
      lazy: () => lazyRoute(async () => (await import('./routes/today/TodayPage.tsx')).TodayPage),
    },
    {
      path: 'chains/:id',
      lazy: () => lazyRoute(async () => (await import('./routes/chain/ChainPage.tsx')).ChainPage),
    },
    {
      path: 'pour/:laterBatchId',
      lazy: () => lazyRoute(async () => (await import('./routes/pour/PourPage.tsx')).PourPage),
    },
    {
      path: 'batches/:id',
      lazy: () => lazyRoute(async () => (await import('./routes/batch/BatchPage.tsx')).BatchPage),
    },
    {
      path: 'yeasts',
      lazy: () =>
        lazyRoute(async () => (await import('./routes/yeasts/YeastsPage.tsx')).YeastsPage),
    },
    {
      path: 'yeasts/:id/family',
      lazy: () =>
        lazyRoute(async () => (await import('./routes/family/FamilyPage.tsx')).FamilyPage),
    },
    {
      path: 'vessels',
      lazy: () =>
        lazyRoute(async () => (await import('./routes/vessels/VesselsPage.tsx')).VesselsPage),
    },
    {
      path: 'people',
      lazy: () =>
        lazyRoute(async () => (await import('./routes/people/PeoplePage.tsx')).PeoplePage),
    },
    {
      path: 'rules',
      lazy: () => lazyRoute(async () => (await import('./routes/rules/RulesPage.tsx')).RulesPage),
    },
    {
      path: 'record',
      lazy: () =>
        lazyRoute(async () => (await import('./routes/record/RecordPage.tsx')).RecordPage),
    },
    {
      path: 'season',
      lazy: () =>
        lazyRoute(async () => (await import('./routes/season/SeasonPage.tsx')).SeasonPage),
    },
    {
      path: 'account',
      lazy: () =>
        lazyRoute(async () => (await import('./routes/account/AccountPage.tsx')).AccountPage),
    },
    {
      path: 'science',
      lazy: () =>
        lazyRoute(async () => (await import('./routes/science/SciencePage.tsx')).SciencePage),
    },
    {
      path: 'print/season',
      lazy: () =>
        lazyRoute(async () => (await import('./routes/print/season/SeasonPrint.tsx')).SeasonPrint),
    },
    {
      path: 'print/chains/:id',
      lazy: () =>
        lazyRoute(async () => (await import('./routes/print/chain/ChainPrint.tsx')).ChainPrint),
    },
    {
      path: 'print/brew-sheets/:id',
      lazy: () =>
        lazyRoute(async () => (await import('./routes/print/sheet/BrewSheet.tsx')).BrewSheet),
    },
    { path: '*', element: <NotFoundPage /> },
  ],
} satisfies RouteObject;

/** Every page is a chunk of its own, so that none pays for another. */
export const router = createBrowserRouter([
  {
    element: <Root />,
    errorElement: <ErrorPage />,
    HydrateFallback: () => null,
    children: [
      {
        index: true,
        lazy: () =>
          lazyRoute(async () => (await import('./routes/welcome/WelcomePage.tsx')).WelcomePage),
      },
      {
        path: 'sign-in',
        lazy: () =>
          lazyRoute(async () => (await import('./routes/sign-in/SignInPage.tsx')).SignInPage),
      },
      {
        path: 'sign-up',
        lazy: () =>
          lazyRoute(async () => (await import('./routes/sign-up/SignUpPage.tsx')).SignUpPage),
      },
      {
        path: 'join/:token',
        lazy: () => lazyRoute(async () => (await import('./routes/join/JoinPage.tsx')).JoinPage),
      },
      {
        path: 'shared/:token',
        lazy: () =>
          lazyRoute(async () => (await import('./routes/shared/SharedPage.tsx')).SharedPage),
      },
      {
        path: 'guest/:token',
        lazy: () => lazyRoute(async () => (await import('./routes/guest/GuestPage.tsx')).GuestPage),
      },
      {
        path: 'about/science',
        lazy: () =>
          lazyRoute(
            async () => (await import('./routes/science/AboutSciencePage.tsx')).AboutSciencePage,
          ),
      },
      {
        path: 'about/checks',
        lazy: () =>
          lazyRoute(async () => (await import('./routes/checks/ChecksPage.tsx')).ChecksPage),
      },
      {
        path: 'breweries',
        lazy: () =>
          lazyRoute(
            async () => (await import('./routes/breweries/BreweriesPage.tsx')).BreweriesPage,
          ),
      },
      {
        path: 'start',
        lazy: () => lazyRoute(async () => (await import('./routes/today/ToStart.tsx')).ToStart),
      },
      {
        path: 'account',
        lazy: () =>
          lazyRoute(async () => (await import('./routes/account/ToAccount.tsx')).ToAccount),
      },
      { path: 'b/:brewery', ...ofBrewery },
      { path: 'b/:brewery/seasons/:season', ...ofBrewery },
      { path: '*', element: <NotFoundPage /> },
    ],
  },
]);

tellTheWay(() => {
  const { location } = router.state.navigation;
  return location ? location.pathname + location.search : null;
});
