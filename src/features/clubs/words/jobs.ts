/** What each timed job of `src/jobs` does, as the page of jobs calls it. */
export const JOB_TITLES: Readonly<Record<string, string>> = {
  'tell-overdue': 'Tells who is overdue',
  'lapse-unsigned': 'Frees sits that nobody signed in for',
  'keep-predictions': 'Keeps what the list said, to compare with the logs',
  'remind-logs': 'Asks for logs not yet written',
  'remind-upkeep': 'Reminds of inspections and chores that fall due',
  'remind-evening': 'Sends the evening before a sit',
  'tell-rested': 'Tells of stands that have rested',
  'tell-rules-changed': 'Tells of changed rules',
  'tell-draws': 'Tells of draws opened and made',
  'send-weekly': 'Sends the week’s summary',
  'tell-wind-turned': 'Tells hunters whose wind has turned',
  'send-mail': 'Sends the mail that waits',
  'refresh-forecasts': 'Fetches new forecasts',
  'remove-orphans': 'Removes photos that belong to nothing',
  tidy: 'Clears away old counts, links and runs',
};
