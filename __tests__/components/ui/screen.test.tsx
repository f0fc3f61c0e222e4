import { fireEvent, render, screen } from '@testing-library/react';

import { LoadingScreen } from '@/components/ui/loading-screen';
import { ProblemScreen } from '@/components/ui/problem-screen';
import { Screen } from '@/components/ui/screen';

afterEach(() => (window.innerWidth = 1024));

it('names the page for the reader and for the tab', () => {
  render(
    <Screen title="Runs" tabTitle="Runs of BLI-0417" back={{ href: '/jobs', label: 'All jobs' }}>
      <p>42 runs</p>
    </Screen>,
  );
  expect(screen.getByRole('heading', { level: 1, name: 'Runs' })).toBeTruthy();
  expect(document.title).toBe('Runs of BLI-0417 · Thickset');
  expect(screen.getByRole('link', { name: 'All jobs' }).getAttribute('href')).toBe('/jobs');
});

it.each([
  [1024, 'before'],
  [390, 'after'],
])('at %p px its one action stands %s what it is about', (width, where) => {
  window.innerWidth = width;
  render(
    <Screen title="Runs" action={{ label: 'New run', onPress: () => undefined }}>
      <p>42 runs</p>
    </Screen>,
  );
  const action = screen.getByRole('button', { name: 'New run' });
  const isAfter = screen.getByText('42 runs').compareDocumentPosition(action) & Node.DOCUMENT_POSITION_FOLLOWING;
  expect(isAfter ? 'after' : 'before').toBe(where);
});

it('says that it is loading, under the title that comes', () => {
  render(<LoadingScreen title="Schedule" shape="table" />);
  expect(screen.getByRole('heading', { level: 1, name: 'Schedule' })).toBeTruthy();
  expect(screen.getByRole('status').textContent).toBe('Loading: Schedule');
});

describe('ProblemScreen', () => {
  it('says what is wrong and tries again where that may help', () => {
    const retry = jest.fn();
    const problem = {
      title: 'No connection',
      status: 0,
      detail: 'No connection. Nothing was lost.',
      reference: 'abc-1',
    };
    render(<ProblemScreen problem={problem} onRetry={retry} />);
    expect(screen.getByRole('heading', { level: 1, name: 'No connection' })).toBeTruthy();
    expect(screen.getByText('Reference for your administrator: abc-1')).toBeTruthy();
    fireEvent.click(screen.getByRole('button', { name: 'Try again' }));
    expect(retry).toHaveBeenCalledTimes(1);
  });
  it.each([403, 404, 410])('offers no second try of a refusal (%p), but a way on', (status) => {
    render(<ProblemScreen problem={{ title: 'Not found', status }} onRetry={jest.fn()} />);
    expect(screen.queryByRole('button', { name: 'Try again' })).toBeNull();
    expect(screen.getByRole('link', { name: 'To the jobs' })).toBeTruthy();
  });
});
