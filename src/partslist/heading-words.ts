import type { Meaning } from "./meanings.ts";

interface Words {
  /** Headings that mean this and hardly anything else. */
  strong: string;
  /** Headings that may mean this; the cells decide. */
  weak?: string;
}

/**
 * Headings of parts lists and price lists in the trade's words, as `plainHeading` writes them (lower case,
 * no accents), parted by bars: English, German, French, Spanish, Italian, Dutch, Polish, Czech, Portuguese,
 * Swedish, Russian, Japanese, Chinese.
 */
export const HEADING_WORDS: Readonly<Record<Meaning, Words>> = {
  designators: {
    strong:
      "designator|designators|reference designator|reference designators|reference designator s|ref designator|ref des|ref desig|refdes|reference|references|reference s|ref|refs|ref s|ref no|part reference|component reference|schematic reference|referenz|referenzen|referenzbezeichner|bauteilbezeichner|bezeichner|bauteil ref|repere|reperes|designateur|designateurs|referencia|referencias|designador|designadores|riferimento|riferimenti|referentie|referenties|aanduiding|oznaczenie|oznaczenia|oznacenie|oznaceni|reference s|referens|referenser|komponentbeteckning|обозначение|поз обозначение|позиционное обозначение|поз обозн|位号|位號|标号|元件位号|リファレンス|回路記号|部品記号|参照番号",
    weak: "part|parts|identifier|name|component|components|position|positions|pos|poz|location|locations|id|label|bauteil|bauteile|bez|beteckning|designation|symbol|bezeichnung|composant|componente|componenti|onderdeel|element|soucastka|komponent|記号|部品番号|позиция|item|symbole|desig|kennung",
  },
  quantity: {
    strong:
      "qty|quantity|quantities|qnty|qty s|qtty|quan|count|pcs|pieces|piece|qty per board|qty per pcb|qty per unit|qty per kit|quantity per board|quantity per pcb|quantity per kit|quantity per unit|qty board|qty pcb|qty kit|pcs per board|per board|per kit|per pcb|menge|anzahl|anz|stuck|stueck|stk|stuckzahl|stueckzahl|stk platine|quantite|qte|nombre|nbre|nb|cantidad|cant|ctd|quantita|qta|q ta|pezzi|pz|aantal|aant|ilosc|szt|sztuk|liczba|pocet|mnozstvi|ks|kusu|pocet ks|quantidade|qtd|qtde|quant|antal|st|antall|kpl|maara|adet|darab|db|количество|кол во|кол|кол во шт|шт|数量|個数|员数|員数|用量|个数|数",
    weak: "amount|number|no|units|used|num|numero|n|x|required|needed|nr",
  },
  value: {
    strong:
      "value|values|val|part value|component value|nominal value|wert|werte|bauteilwert|valeur|valeurs|valor|valores|valore|valori|waarde|wartosc|hodnota|varde|номинал|номиналы|значение|値|定数|值|参数|数值",
    weak: "comment|comments|designation|name|part|part name|nominal|rating|type|typ|specification|spec|specs|description|規格|规格|型号|型番|nazwa|device|component|model|bezeichnung|denomination|tipo|тип",
  },
  description: {
    strong:
      "description|descriptions|desc|descr|item description|part description|component description|product description|details|detail|plain name|part name|component name|item name|product name|product|title|beschreibung|bauteilbeschreibung|benennung|artikelbezeichnung|libelle|descripcion|descrizione|denominazione|omschrijving|opis|nazwa|popis|nazev|descricao|beskrivning|benamning|описание|наименование|名称|品名|描述|说明|摘要|製品名",
    weak: "name|part|parts|item|items|component|components|designation|bezeichnung|artikel|material|comment|type|typ|device|bauteil|device|article|articulo|articolo|produkt|prodotto|producto|produit|specification|spec|what|thing|category",
  },
  package: {
    strong:
      "package|packages|footprint|footprints|pcb footprint|package footprint|case package|package case|case|case size|case style|body|body and holes|housing|bauform|gehause|gehaeuse|bauform gehause|boitier|empreinte|encapsulado|huella|contenitore|impronta|package type|behuizing|obudowa|pouzdro|encapsulamento|invollucro|kapsel|hus|корпус|посадочное место|封装|封裝|パッケージ|外形|フットプリント",
    weak: "size|dimension|dimensions|pattern|land pattern|decal|form|bauart|形状|format|grosse|taille|tamano|baugrosse",
  },
  manufacturer: {
    strong:
      "manufacturer|manufacturers|manufacturer name|mfr|mfr name|mfg|mfg name|mfgr|manf|manuf|mnf|maker|make|brand|hersteller|herst|fabricant|fabricante|produttore|costruttore|fabrikant|producent|vyrobce|tillverkare|производитель|メーカー|メーカ|厂商|制造商|厂家|品牌|生产商",
    weak: "marque|marca|company|firma",
  },
  "part-number": {
    strong:
      "mpn|mpns|manufacturer part number|manufacturer part|manufacturer part no|mfr part number|mfr part no|mfr part|mfr no|mfr pn|mfg part number|mfg part no|mfg pn|manf no|manf part no|mfn|herstellernummer|hersteller nr|herst nr|hersteller teilenummer|hersteller artikelnummer|reference fabricant|ref fabricant|referencia fabricante|referencia del fabricante|codice produttore|codice costruttore|numer producenta|symbol producenta|cislo vyrobce|codigo do fabricante|tillverkarens artikelnummer|партномер|型番|型号|制造商型号|厂商型号|メーカー型番",
    weak: "part number|part no|part nr|part num|partnumber|pn|p n|part code|type number|teilenummer|teile nr|typ|type|model|model no|numero de parte|numero parte|referencia|reference|料号|品番|артикул",
  },
  supplier: {
    strong:
      "supplier|suppliers|supplier name|vendor|vendors|distributor|distributors|dist|supplied by|purchased from|lieferant|lieferanten|lief|bezugsquelle|handler|handlerin|fournisseur|fournisseurs|proveedor|fornitore|fornitori|leverancier|dostawca|dodavatel|fornecedor|leverantor|поставщик|供应商|供應商|仕入先|購入先|经销商|spr",
    weak: "source|store|shop|seller|from|where|quelle|boutique|tienda|sklep|buy from|where to buy|supply",
  },
  "order-code": {
    strong:
      "order code|order codes|order no|order number|order nr|ordering code|order ref|stock code|stock no|sku|supplier part number|supplier part|supplier part no|supplier ref|supplier code|supplier no|supplier and ref|supplier reference|supplier sku|vendor part number|vendor part|vendor part no|vendor pn|vendor no|distributor part number|distributor part no|distributor part|dpn|spn|catalog no|catalog number|catalogue number|catalogue no|cat no|bestellnr|bestell nr|bestellnummer|best nr|best no|bestnr|artikelnummer|artikelnr|artikel nr|art nr|art no|artnr|lieferantennummer|reference fournisseur|ref fournisseur|code commande|code article|referencia proveedor|codigo de pedido|codigo proveedor|codice ordine|codice articolo|codice fornitore|bestelnummer|bestelnr|numer katalogowy|nr katalogowy|nr kat|objednaci cislo|obj cislo|codigo do fornecedor|bestallningsnummer|код заказа|артикул|注文コード|订货号|商城编号|供应商编号|商品编号",
    weak: "part number|part no|code|codigo|codice|kod|ref|reference|item no|item number|article|article no|product code|pn|品番",
  },
  "price-each": {
    strong:
      "price|prices|unit price|price each|each|price per unit|price per piece|price per pc|price unit|price pc|piece price|per piece|unit cost|cost each|cost per unit|cost per piece|price ea|approximate price|approx price|einzelpreis|stuckpreis|stueckpreis|preis|preis stuck|preis stk|e preis|ep|preis pro stuck|prix|prix unitaire|prix unite|pu|precio|precio unitario|prezzo|prezzo unitario|prijs|stukprijs|prijs per stuk|cena|cena jednostkowa|cena szt|cena ks|cena za kus|preco|preco unitario|pris|styckpris|a pris|pris st|цена|цена за шт|単価|价格|单价|價格|單價",
    weak: "cost|costs|kosten|cout|coste|costo|koszt|eur|euro|usd|gbp|chf|€|$|£|rate",
  },
  "price-break": { strong: "" },
  "break-quantity": {
    strong:
      "break|price break|break qty|break quantity|from qty|from quantity|qty from|qty break|quantity break|ab menge|ab stuck|staffel|staffelmenge|ab|a partir de|des|desde|da|vanaf|od|od ilosci|a partir|fran|от|起",
    weak: "from|min qty|qty|quantity|menge|stuck|minimum qty",
  },
  "line-total": {
    strong:
      "total price|total cost|ext price|ext cost|extended price|extended cost|extended|ext|line total|line price|line cost|subtotal|sub total|price total|cost total|total cost usd|gesamtpreis|gesamt|gesamtkosten|gp|prix total|total ht|montant|importe|precio total|prezzo totale|importo|totaalprijs|totaal|cena celkem|celkem|wartosc netto|razem|preco total|summa|totalpris|сумма|стоимость|итого|итог|金額|小计|总价|合计|合計|總價",
    weak: "total|totals|sum|summe|totale|suma|amount|betrag|valor total|cost",
  },
  currency: {
    strong:
      "currency|curr|ccy|wahrung|waehrung|devise|monnaie|moneda|valuta|waluta|mena|moeda|валюта|通貨|币种|货币",
  },
  "minimum-order": {
    strong:
      "moq|min order|minimum order|minimum order quantity|min order qty|minimum qty|minimum quantity|mindestmenge|mindestbestellmenge|mbm|mindestabnahme|quantite minimale|quantite minimum|minimo de pedido|cantidad minima|pedido minimo|ordine minimo|quantita minima|minimale afname|minimalne zamowienie|min zamowienie|minimalni odber|min odber|quantidade minima|minsta order|минимальный заказ|мин заказ|最小订购量|最小起订量|起订量|最小注文数",
    weak: "minimum|min qty|min",
  },
  "order-multiple": {
    strong:
      "order multiple|multiple|multiples|multiples of|mult|spq|pack size|pack qty|pack quantity|package quantity|packaging unit|pack unit|vpe|ve|verpackungseinheit|vielfaches|conditionnement|multiple de commande|multiplo|unidad de embalaje|confezione|verpakkingseenheid|wielokrotnosc|opakowanie|baleni|nasobek|embalagem|forpackning|кратность|упаковка|倍数|包装数|包装数量",
    weak: "pack|packing",
  },
  stock: {
    strong:
      "stock|in stock|stock qty|stock level|availability|available|qty available|on hand|lager|lagerbestand|bestand|verfugbar|verfugbarkeit|en stock|disponible|disponibilite|disponibilidad|existencias|disponibilita|giacenza|voorraad|stan magazynowy|stan|dostepnosc|skladem|sklad|dostupnost|estoque|disponibilidade|lagersaldo|наличие|склад|在庫|库存|庫存",
  },
  "lead-time": {
    strong:
      "lead time|leadtime|lead time days|lead time weeks|delivery|delivery time|days|lieferzeit|lieferfrist|delai|delai de livraison|plazo|plazo de entrega|tempi di consegna|tempo di consegna|levertijd|czas dostawy|termin dostawy|termin|dodaci lhuta|dodani|prazo|prazo de entrega|leveranstid|срок поставки|срок|納期|货期|交期|交货期",
    weak: "weeks|eta",
  },
  drawer: {
    strong:
      "drawer|bin|bin no|shelf|storage|storage location|storage place|lagerort|lagerplatz|fach|schublade|emplacement|tiroir|cajon|ubicacion|cassetto|lade|vak|szuflada|miejsce|zasuvka|umisteni|gaveta|lada|ячейка|ящик|棚番|仓位|库位",
    weak: "box|location|rack|compartment|place",
  },
  "do-not-place": {
    strong:
      "dnp|dnf|dni|dns|dnm|nopop|no pop|do not place|do not populate|do not fit|do not install|do not mount|do not stuff|not fitted|not placed|not populated|dnp dnf|dnp y n|unpopulated|nicht bestuckt|nicht bestuecken|nicht bestucken|unbestuckt|nb|n b|exclude from board|exclude|non monte|ne pas monter|no montar|no poner|non montare|niet plaatsen|niet gemonteerd|nie montowac|niemontowane|neosazovat|neosazeno|nao montar|monteras ej|не устанавливать|未実装|不贴|不焊",
  },
  place: {
    strong:
      "populate|populated|fitted|fit|mounted|mount|assemble|assembled|install|installed|stuff|stuffed|bestuckt|bestucken|bestuecken|bestuckung|monte|a monter|montado|montar|montato|montare|gemonteerd|plaatsen|montowac|osadit|osazeno|monteras|устанавливать|実装|贴装",
    weak: "place|placed|placement|include",
  },
  class: {
    strong:
      "class|category|categories|component type|part type|kind|kind of part|group|part class|kategorie|bauteilart|bauteiltyp|warengruppe|gruppe|categorie|famille|categoria|famiglia|familia|soort|kategoria|rodzaj|skupina|kategori|категория|группа|分类|类别|種類|类型",
    weak: "type|typ|art|tipo|family|тип",
  },
  note: {
    strong:
      "note|notes|remark|remarks|bemerkung|bemerkungen|bem|anmerkung|anmerkungen|hinweis|hinweise|kommentar|remarque|remarques|observation|observations|observaciones|observacion|notas|nota|osservazioni|opmerking|opmerkingen|uwagi|uwaga|poznamka|poznamky|observacoes|observacao|anmarkning|anmarkningar|примечание|примечания|комментарий|備考|备注|備註|alternative|alternatives|alternate|substitute|substitutes|purpose|function|used for|use",
    weak: "comment|comments|info|status|application|misc",
  },
  tolerance: {
    strong:
      "tolerance|tol|tol %|tolerances|toleranz|tolerancia|tolleranza|tolerantie|tolerancja|tolerans|допуск|точность|公差|精度|误差|許容差",
    weak: "accuracy|%",
  },
  power: {
    strong:
      "power|power rating|wattage|watt|watts|power w|leistung|belastbarkeit|puissance|potencia|potenza|vermogen|moc|vykon|effekt|мощность|功率|電力|定格電力",
  },
  voltage: {
    strong:
      "voltage|rated voltage|voltage rating|volt|volts|voltage v|max voltage|spannung|nennspannung|spannungsfestigkeit|tension|voltaje|tensione|spanning|napiecie|napeti|tensao|spanning v|напряжение|电压|耐压|耐圧|定格電圧",
  },
  "hole-spacing": {
    strong:
      "hole spacing|lead spacing|pin spacing|spacing|pitch|lead pitch|rastermass|raster|rm|rm mm|entraxe|pas|pas mm|paso|passo|steek|rozstaw|raster mm|roztec|espacamento|delning|шаг|脚距|间距|ピッチ",
  },
  datasheet: {
    strong:
      "datasheet|data sheet|datasheets|datasheet url|datasheet link|datenblatt|fiche technique|hoja de datos|scheda tecnica|datablad|karta katalogowa|datovy list|ficha tecnica|даташит|数据手册|规格书|データシート|url|urls|link|links|web|website|web link|web page|product link|product url|purchase link|order link|buy link|hyperlink|href|ссылка|lien|enlace|odkaz|链接",
    weak: "documentation|docs|doc",
  },
  "line-number": {
    strong:
      "item no|line|line no|line number|line item|row|row no|index|sr no|s no|sl no|serial no|lfd nr|lfd|laufende nummer|zeile|ligne|linea|riga|regel|lp|l p|radek|rad|linha|序号|序號|項番|№ п п|no п п|п п",
    weak: "item|items|no|nr|id|pos|position|poz|number|num|numero|n|component|番号|part|n°",
  },
  "leave-out": {
    strong:
      "x|y|device|sheet|sheets|page|gate|rotation|rot|angle|side|layer|mid x|mid y|center x|center y|centre x|centre y|ref x|ref y|pad x|pad y|pos x|pos y|lib part|libpart|library|lib ref|libref|library ref|footprint lib|footprint library|footprintlib|symbol|optional|order qty|order quantity|qty to order|quantity to order|qty needed|total qty|total quantity|qty total|quantity ordered|bestellmenge|gesamtmenge|cantidad total|quantite totale|checked|ordered|order|color|colour|series|mounting type|mounting|technology|rohs|pins|pin count|pads|weight|revision|version",
  },
};
