/**
 * What the commonest passwords are made of. From memory of the lists that have been published again and again, not
 * copied from one: words and runs that people choose first, here and in this country. Digits and signs around a word,
 * and digits in place of letters, do not make it another one (see is-common-password.ts), so each stands once.
 */
const WORDS = `
password passwort passw pass passcode passphrase letmein welcome changeme changeit default admin administrator root toor
user username guest login signin master access secret secure security private computer internet network server system
test tester testing testtest temp temporary example sample demo hello hellothere helloworld whatever nothing something
iloveyou loveyou lovely lover love mylove sweetheart darling princess prince angel angels babygirl baby babyboy sunshine
moonlight rainbow butterfly flower flowers blossom chocolate cookie cupcake sugar honey cheese banana orange apple cherry
strawberry pepper ginger pumpkin coffee whisky guinness monkey dragon tiger tigger lion wolf eagle falcon phoenix panther
jaguar mustang ferrari porsche mercedes corvette camaro harley yamaha kawasaki football baseball basketball softball
soccer hockey tennis cricket rugby golf liverpool chelsea arsenal everton tottenham newcastle sunderland rangers celtic
manchester manutd mancity westham astonvilla leeds barcelona juventus realmadrid england scotland wales ireland britain
london glasgow cardiff belfast birmingham blackpool sheffield yorkshire lancashire cornwall america canada australia
superman batman spiderman ironman starwars startrek pokemon pikachu naruto minecraft fortnite matrix gandalf hobbit
merlin wizard warrior samurai ninja shadow hunter ranger soldier killer slayer assassin destroyer maverick rebel pirate
freedom forever happy happiness family mother father mummy daddy brother sister grandma grandad friend friends bestfriend
michael michelle jessica jennifer jasmine jordan joshua matthew andrew daniel thomas robert william george charlie charles
charlotte oliver olivia harry jack james joseph david anthony nicholas nicola natalie nathan samantha stephanie amanda
andrea ashley hannah heather maggie patrick peter richard ronaldo messi rooney beckham elvis metallica nirvana slipknot
january february march april may june july august september october november december monday tuesday wednesday thursday
friday saturday sunday spring summer autumn winter christmas easter halloween birthday
google facebook twitter instagram youtube yahoo hotmail gmail microsoft windows samsung android iphone linkedin
qwerty qwertyuiop qwertyui qwertz azerty asdf asdfgh asdfghjk asdfghjkl zxcvbn zxcvbnm qazwsx qazwsxedc wsxedc
abc abcd abcdef abcdefg abcdefgh abcdefghi abcxyz xyz aaa bbb
landlord landlords letting lettings tenant tenants housing house houses home homes property properties rent rental
electric electrical electrician electricity fuse fuses fuseward consumerunit wiring inspection inspector
trustno iamgod jesus jesuschrist christ blessed heaven faith grace church bismillah
`

/** Words that are a whole password often enough to be tried first. */
export const COMMON_WORDS: ReadonlySet<string> = new Set(WORDS.split(/\s+/).filter(Boolean))
