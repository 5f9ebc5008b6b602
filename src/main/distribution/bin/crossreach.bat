@echo off
rem Starts Crossreach on the Java that JAVA_HOME names, or else on the one in the PATH.
rem CROSSREACH_JAVA_OPTS: options for the Java virtual machine, for example -Xmx4g
setlocal
set "HOME_FOLDER=%~dp0.."
set "JAVA=java"
if defined JAVA_HOME set "JAVA=%JAVA_HOME%\bin\java"
set "COLLECTOR=-XX:+UseSerialGC"
echo "%CROSSREACH_JAVA_OPTS%" | findstr /r /c:"-XX:+Use.*GC" >nul && set "COLLECTOR="
"%JAVA%" -Xshare:auto -Xlog:disable %COLLECTOR% "-XX:SharedArchiveFile=%HOME_FOLDER%\lib\crossreach.jsa" %CROSSREACH_JAVA_OPTS% -cp "%HOME_FOLDER%\lib\crossreach.jar" org.crossreach.cli.Crossreach %*
exit /b %ERRORLEVEL%
