/**
 * Long passwords that are tried first: keyboard runs, counted digits, lines known by heart, doubled short favourites. Compared
 * without case, spaces and punctuation. Rows of one letter, repeated short pieces and straight runs are found by rule instead.
 *
 * Source: project rule, our own list, as OWASP ASVS 5.0, 6.2.4 asks for one
 */
export const COMMON_PASSWORDS: ReadonlySet<string> = new Set(
  `
  administrator1234 adminadminadmin123 administratoradmin adminpassword1234 allyouneedislove allyourbasearebelongtous
  baseballbaseball basketballbasketball batterystaplehorse billgatesstevejobs chocolatechocolate changemechangeme123
  changethispassword changeyourpassword computercomputer computer123456789 correcthorsebattery correcthorsebatterystaple
  defaultpassword1 defaultpassword123 donttellanyone123 dragondragondragon footballfootball fourscoreandseven
  fourwordsalluppercase godblessamerica1 harrypotterharrypotter helloworldhelloworld hellohellohello1 heyjudehelloworld
  iamtheadministrator iforgotmypassword icanthasapassword1 ihatepasswords123 iloveyouforever123 iloveyouiloveyou
  iloveyousomuch123 inthebeginning123 itsasecretpassword ithinkthereforeiam jesusjesusjesus1 jesuslovesyou123
  justletmeinplease letmeinletmeinletmein letmeinletmein123 letmeinplease1234 liverpoolliverpool longpassword1234
  longpassword12345 loginloginlogin1 manchesterunited masterpassword123 maytheforcebewithyou michaeljordan2323
  monkeymonkeymonkey mydogisthebestdog mynewpassword123 mypasswordispassword mypassword123456 mysecretpassword
  mysecurepassword newpassword12345 nevergonnagiveyouup nopasswordneeded1 onceuponatime123 oncemoreuntothebreach
  openthedoorplease opensesameopensesame password12345678 password123456789 password1234567890 password1password1
  password123password passwordpassword passwordpassword1 passwordpassword123 passwordadministrator passwordispassword
  pleaseletmeinnow princessprincess qazwsxedcrfvtgb qazwsxedcrfvtgbyhn qazxswedcvfrtgb qwerasdfzxcv1234 qwertyqwertyqwerty
  qwertyuiop123456 qwertyuiop1234567890 qwertyuiopasdfg qwertyuiopasdfgh qwertyuiopasdfghjkl qwertyuiopasdfghjklzxcvbnm
  qwertyuiopqwertyuiop asdfghjklqwertyuiop 1qaz2wsx3edc4rfv 1q2w3e4r5t6y7u8i 1q2w3e4r5t6y7u8i9o0p q1w2e3r4t5y6u7i8
  zaq12wsxcde34rfv zaq1xsw2cde3vfr4 zxcvbnmasdfghjkl secretsecretsecret secretpassword123 somewhereovertherainbow
  starwarsstarwars steveaustin31676 sunshinesunshine supermansuperman supersecretpassword supersecurepassword
  temporarypassword thequickbrownfox thequickbrownfoxjumps thisisapassword thisisapassword1 thisismypassword
  thisismypassword1 thisisnotapassword thisissecret1234 tobeornottobe123 tobeornottobethatisthequestion trustno1trustno1
  trustnoonetrustnoone verysecretpassword verysecurepassword verylongpassword verylongpassword1 welcomewelcome123
  welcometothejungle welcome1234567890 whatisthepassword whateverwhatever winteriscoming1 winteriscoming123
  youshallnotpass1 youshallnotpass123 yesterdayallmytroubles
  `
    .trim()
    .split(/\s+/),
)
