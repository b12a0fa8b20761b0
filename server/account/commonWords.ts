/**
 * Words that passwords are usually built around, in lower case and without digits or signs. From memory of what published lists
 * of leaked passwords share: names, pets, teams in general, months, keyboard rows, words of affection.
 */
export const commonWords: ReadonlySet<string> = new Set(`
password passwort passphrase passcode motdepasse contrasena senha wachtwoord secret geheim letmein welcome willkommen bienvenue login signin admin administrator
root user guest test testing tester demo default changeme change temp temporary access master manager system server computer internet windows linux
macbook iphone android samsung google email mail office company business work home family house garden kitchen
qwerty qwertyuiop qwertz qwertzuiop azerty azertyuiop asdf asdfgh asdfghjkl zxcvbn zxcvbnm qazwsx qazwsxedc qweasd qweasdzxc wasd poiuytrewq lkjhgfdsa mnbvcxz
abc abcd abcdef abcdefg abcdefgh abcdefghijkl abcabc aaa xyz onetwothree onetwothreefour
iloveyou ilove loveyou lovely love lover loveme iloveu mylove truelove forever together honey sweetheart sweetie darling baby babygirl babyboy angel angels
princess prince queen king kingdom sunshine sunflower sunrise sunset moonlight starlight rainbow butterfly dolphin flower flowers roses rosebud blossom cherry
dragon dragons monkey tiger tigers lion lions eagle eagles falcon wolf wolves bear bears panther cat kitten kitty dog doggy puppy bunny rabbit horse horses pony
unicorn turtle penguin elephant giraffe chicken cowboy cowboys spider ninja pirate wizard magic merlin phoenix shadow ghost vampire zombie monster hunter killer
warrior soldier knight samurai legend hero superman batman spiderman ironman starwars pokemon pikachu gandalf matrix
football soccer baseball basketball hockey tennis golf golfer rugby cricket racing runner fishing fisher sailing swimmer champion champions winner winners team
player players united liverpool arsenal chelsea barcelona madrid yankees rangers lakers
michael michelle jennifer jessica ashley amanda daniel daniela andrew andrea anthony antonio thomas robert roberto william charlie charles george jordan joshua
matthew nicole nicholas samantha samuel elizabeth stephanie christian christina christine christopher alexander alexandra benjamin jonathan patrick patricia
richard sandra sarah susan maria martin martina marina monica natalie natasha oliver olivia peter phillip rachel rebecca sabrina sebastian sophia sophie steven
tiffany vanessa veronica victoria vincent xavier anna anne barbara carlos carmen carolina david diana edward emily emma eric fernando francis gabriel hannah harry
heather isabella jackson jacob james jasmine jason jasper joseph justin karen katherine kevin laura lauren leonard linda lisa lucas maggie marcus mark maxwell
january february march april may june july august september october november december monday tuesday wednesday thursday friday saturday sunday
spring summer autumn winter holiday christmas halloween easter birthday vacation weekend morning evening tonight today tomorrow yesterday
london paris berlin newyork chicago boston dallas texas california florida america american canada england scotland ireland germany france spain italy mexico brazil
india china japan australia europe africa
chocolate cookie cookies cookie coffee banana bananas orange oranges apple apples strawberry blueberry peaches pepper ginger cinnamon vanilla sugar candy cheese
butter pizza pasta chicken bacon tomato potato pumpkin popcorn cupcake muffin
music guitar piano drummer metallica nirvana beatles rockstar rocknroll hiphop dancer dancing singer jazz blues
mustang corvette ferrari porsche mercedes toyota honda yamaha harley camaro jaguar truck
diamond diamonds golden silver platinum crystal emerald ruby sapphire jewel treasure money dollar dollars million millionaire lucky lucky fortune
freedom liberty justice peace hope faith grace heaven jesus jesuschrist christ church blessed blessing bible god godisgood trinity
hello hellohello goodbye whatever nothing something everything anything nobody somebody please thankyou trustno trustme believe dream dreams dreamer
happy happiness smile smiley friend friends friendship bestfriend bestfriends buddy mother father mommy daddy mama papa brother sister grandma grandpa
blue red green yellow purple pink black white brown grey gray violet
super power energy rocket galaxy universe planet earth ocean mountain river thunder lightning storm fire ice water snow snowball cloud
school college student teacher doctor nurse police fireman lawyer engineer
sewing sewer seamstress tailor tailoring dressmaker dressmaking needle needles thread threads fabric fabrics cotton linen pattern patterns toile muslin bobbin
scissors thimble quilting quilter stitch stitches stitching fitting fitter garment
`.trim().split(/\s+/))
