/**
 * Words that common passwords are made of, written down by hand: what people choose most, where
 * they are told to choose. A password of 15 characters that is nothing but these is refused, such
 * as "password1234567" or "letmeinletmein!".
 */
export const commonWords: readonly string[] = `
password passwort passwd pass pasword parola motdepasse contrasena secret secure security login
logon signin access admin administrator root user username guest test tester testing default
changeme change me letmein let in welcome hello hallo bonjour hola please open sesame opensesame
qwerty qwertz azerty qwertyuiop qwer asdf asdfgh asdfghjkl zxcv zxcvbn zxcvbnm qaz wsx edc qazwsx
abc abcd abcde abcdef abcdefg abcabc xyz aaa iloveyou ilove you love lover mylove forever always
monkey dragon master shadow sunshine princess football baseball basketball hockey soccer batman
superman spiderman starwars pokemon trustno trustnoone whatever freedom ninja mustang michael
jordan jennifer jessica charlie daniel thomas george andrew robert joshua matthew ashley nicole
michelle hannah amanda maggie buster killer hunter harley ranger summer winter spring autumn
january february march april may june july august september october november december monday
tuesday wednesday thursday friday saturday sunday london paris berlin england liverpool chelsea
arsenal manchester united computer internet google facebook apple samsung windows microsoft linux
cheese banana cookie chocolate flower ginger pepper orange purple yellow silver golden diamond
angel baby babygirl family mother father mom dad dog cat tiger lion eagle phoenix thunder lucky
money dollar matrix star stars moon space galaxy planet planetarium dome museum science universe
correct horse battery staple correcthorsebatterystaple farwheel far wheel my your our the is a new
old i am it this that one two three four five six seven eight nine zero
`
	.trim()
	.split(/\s+/);
